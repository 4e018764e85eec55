package evensun.run;

import evensun.evaluation.Bench;
import evensun.evaluation.Outcomes;
import evensun.evaluation.Parameter;
import evensun.pluginhost.PluginHost;
import evensun.result.Outcome;
import evensun.scenario.Fault;
import evensun.scenario.InputException;
import evensun.scenario.Place;
import evensun.scenario.Scenario;
import evensun.scenario.reader.Draft;
import evensun.scenario.reader.Setting;
import evensun.spi.EvaluationFailed;
import evensun.spi.UnsupportedProblem;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.concurrent.ExecutionException;
import java.util.concurrent.ExecutorService;
import java.util.concurrent.Executors;
import java.util.concurrent.Future;
import java.util.function.Consumer;
import org.jspecify.annotations.Nullable;

/**
 * A scenario evaluated once per row of a table, in parallel, answered in order. Rows that only move
 * thicknesses and bandgaps share one preparation; others are read and prepared anew.
 */
public final class EachJob {

  private final Draft draft;
  private final List<Setting> settings;
  private final RowTable table;
  private final String tableName;
  private final PluginHost host;

  /**
   * A job.
   *
   * @param draft the scenario
   * @param settings values replaced in every row
   * @param tableName name of the table in messages
   * @param table the rows
   * @param host loaded solvers
   */
  public EachJob(
      Draft draft, List<Setting> settings, String tableName, RowTable table, PluginHost host) {
    this.draft = draft;
    this.settings = List.copyOf(settings);
    this.tableName = tableName;
    this.table = table;
    this.host = host;
  }

  /**
   * What became of a row.
   *
   * @param row number of the row, from 1
   * @param values its values by column
   * @param outcome the outcome, null for a row that failed
   * @param faults why it failed
   */
  public record Answer(
      int row, List<String> values, @Nullable Outcome outcome, List<Fault> faults) {

    public Answer {
      values = List.copyOf(values);
      faults = List.copyOf(faults);
    }
  }

  /**
   * Evaluates every row.
   *
   * @param threads number of threads
   * @param answers hears each answer, in the order of the rows
   * @throws InputException when the scenario itself is wrong
   */
  public void run(int threads, Consumer<Answer> answers) {
    Scenario scenario = draft.bind(settings);
    try (Preparation shared = Preparation.of(scenario, host, () -> false)) {
      Optional<List<Parameter>> parameters = parameters(shared);
      ExecutorService pool = Executors.newFixedThreadPool(threads);
      try {
        List<Future<List<Answer>>> futures = new ArrayList<>();
        int chunk = Math.max(1, Math.min(64, table.rows().size() / (4 * threads) + 1));
        for (int from = 0; from < table.rows().size(); from += chunk) {
          int first = from;
          int last = Math.min(table.rows().size(), from + chunk);
          futures.add(pool.submit(() -> answer(shared, parameters, first, last)));
        }
        for (Future<List<Answer>> future : futures) {
          future.get().forEach(answers);
        }
      } finally {
        pool.shutdownNow();
      }
    } catch (ExecutionException e) {
      throw new IllegalStateException(e.getCause());
    } catch (InterruptedException e) {
      Thread.currentThread().interrupt();
      throw new IllegalStateException(e);
    }
  }

  /** The parameters of all columns, or empty when a column is not one. */
  private Optional<List<Parameter>> parameters(Preparation shared) {
    List<Parameter> parameters = new ArrayList<>();
    for (String key : table.keys()) {
      Optional<Parameter> parameter = Parameter.of(key, shared.stack());
      if (parameter.isEmpty()) {
        return Optional.empty();
      }
      parameters.add(parameter.get());
    }
    return Optional.of(parameters);
  }

  private List<Answer> answer(
      Preparation shared, Optional<List<Parameter>> parameters, int first, int last) {
    List<Answer> answers = new ArrayList<>();
    try (Bench bench = shared.model().newBench()) {
      for (int i = first; i < last; i++) {
        RowTable.Row row = table.rows().get(i);
        answers.add(answer(i + 1, row, bench, parameters));
      }
    }
    return answers;
  }

  private Answer answer(
      int number, RowTable.Row row, Bench bench, Optional<List<Parameter>> parameters) {
    try {
      Outcome outcome =
          parameters.isPresent()
              ? move(bench, parameters.get(), row)
              : prepare(draft.bind(all(row)));
      return new Answer(number, row.values(), outcome, List.of());
    } catch (InputException e) {
      return new Answer(number, row.values(), null, e.faults());
    } catch (EvaluationFailed | UnsupportedProblem e) {
      Fault fault = new Fault(place(row), String.valueOf(e.getMessage()));
      return new Answer(number, row.values(), null, List.of(fault));
    }
  }

  private List<Setting> all(RowTable.Row row) {
    List<Setting> all = new ArrayList<>(settings);
    for (int c = 0; c < table.keys().size(); c++) {
      all.add(new Setting(table.keys().get(c), row.values().get(c), place(row)));
    }
    return all;
  }

  private Place place(RowTable.Row row) {
    return new Place(tableName, row.line(), 1, "");
  }

  private Outcome move(Bench bench, List<Parameter> parameters, RowTable.Row row) {
    // the rules of the scenario hold for every row, whichever way it is evaluated
    draft.checkStack(all(row));
    for (int c = 0; c < parameters.size(); c++) {
      Parameter parameter = parameters.get(c);
      double value = Double.parseDouble(row.values().get(c));
      Varied.checkInTuning(parameter, value, bench.model().stack(), place(row));
      bench.set(parameter, value);
    }
    return Outcomes.of(bench, parameters);
  }

  private Outcome prepare(Scenario scenario) {
    try (Preparation own = Preparation.of(scenario, host, () -> false);
        Bench bench = own.model().newBench()) {
      return Outcomes.of(bench, List.of());
    }
  }
}
