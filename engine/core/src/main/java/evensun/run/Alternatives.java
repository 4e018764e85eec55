package evensun.run;

import evensun.evaluation.StackObjective;
import evensun.scenario.InputException;
import evensun.scenario.Scenario;
import evensun.scenario.SearchSpec.ChoiceSpec;
import evensun.search.problem.Candidate;
import evensun.search.problem.Objective;
import evensun.search.problem.Variable;
import evensun.search.problem.Verdict;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.HashSet;
import java.util.List;
import java.util.Set;

/**
 * A search with choices: one stack made ready for every combination of alternatives. The numbers
 * that vary come first among its variables, the choices last.
 */
final class Alternatives implements Objective, AutoCloseable {

  /** More combinations would take long to prepare and to search. */
  private static final int MOST = 64;

  private final List<ChoiceSpec> choices;
  private final List<Variable> numbers;
  private final List<Option> options = new ArrayList<>();

  /**
   * One combination.
   *
   * @param preparation its stack made ready
   * @param aims what is wanted of it
   * @param varied what varies in it: less than elsewhere where a layer is absent
   * @param objective all this as the search sees it
   */
  record Option(Preparation preparation, Aims aims, Varied varied, StackObjective objective) {

    boolean hasLayer(String name) {
      return preparation.stack().layers().stream()
          .anyMatch(layer -> layer.name().equals(name) && layer.spec().present());
    }

    /** The values of this combination's own variables. */
    double[] own(List<Variable> numbers, List<Double> values) {
      double[] own = new double[varied.variables().size()];
      for (int i = 0; i < own.length; i++) {
        own[i] = values.get(index(numbers, varied.variables().get(i).key()));
      }
      return own;
    }
  }

  private Alternatives(List<ChoiceSpec> choices, List<Variable> numbers) {
    this.choices = choices;
    this.numbers = numbers;
  }

  /**
   * Makes every combination ready.
   *
   * @param drawn the scenario as drawn, made ready
   * @param numbers what varies beside the choices
   */
  static Alternatives of(Preparation drawn, List<ChoiceSpec> choices, List<Variable> numbers) {
    int count =
        choices.stream().mapToInt(choice -> choice.names().size()).reduce(1, (a, b) -> a * b);
    if (count > MOST) {
      throw new InputException(
          choices.get(0).place(),
          "the choices have %d combinations, at most %d are searched; leave some out"
              .formatted(count, MOST));
    }
    Alternatives alternatives = new Alternatives(choices, numbers);
    try {
      for (int i = 0; i < count; i++) {
        alternatives.options.add(
            option(drawn, drawn.stack().scenario().settled(alternatives.names(i))));
      }
    } catch (RuntimeException e) {
      alternatives.close();
      throw e;
    }
    return alternatives;
  }

  private static Option option(Preparation drawn, Scenario settled) {
    Preparation preparation = Preparation.of(settled, drawn.host(), () -> false);
    var spec = settled.search().orElseThrow();
    Aims aims = Aims.of(spec, preparation.model());
    Varied varied = Varied.of(spec, preparation.stack());
    return new Option(
        preparation,
        aims,
        varied,
        new StackObjective(
            preparation.model(),
            varied.parameters(),
            varied.variables(),
            aims.all(),
            aims.limits()));
  }

  private static int index(List<Variable> variables, String key) {
    for (int i = 0; i < variables.size(); i++) {
      if (variables.get(i).key().equals(key)) {
        return i;
      }
    }
    throw new IllegalArgumentException(key);
  }

  /** The alternatives of a combination, the first choice running fastest. */
  private List<String> names(int combination) {
    List<String> names = new ArrayList<>();
    int rest = combination;
    for (ChoiceSpec choice : choices) {
      names.add(choice.names().get(rest % choice.names().size()));
      rest /= choice.names().size();
    }
    return names;
  }

  private int combination(List<Double> values) {
    int combination = 0;
    for (int i = choices.size() - 1; i >= 0; i--) {
      int picked = (int) Math.round(values.get(numbers.size() + i));
      combination = combination * choices.get(i).names().size() + picked;
    }
    return combination;
  }

  /** The combination of a design. */
  Option option(Candidate candidate) {
    return options.get(combination(candidate.values()));
  }

  /** A design as its combination knows it. */
  Candidate own(Candidate candidate) {
    List<Double> own = new ArrayList<>();
    for (double value : option(candidate).own(numbers, candidate.values())) {
      own.add(value);
    }
    return new Candidate(own, candidate.verdict());
  }

  /** What the values of its candidates mean. */
  Designs designs() {
    return new Designs(variables(), this::present);
  }

  /** Keys of what varies in a design; the material of a layer left out does not matter. */
  private Set<String> present(Candidate candidate) {
    Option option = option(candidate);
    Set<String> keys = new HashSet<>();
    option.varied().variables().forEach(v -> keys.add(v.key()));
    choices.stream()
        .filter(c -> c.isPresence() || option.hasLayer(c.layer()))
        .forEach(c -> keys.add(c.key()));
    return keys;
  }

  @Override
  public List<Variable> variables() {
    List<Variable> all = new ArrayList<>(numbers);
    choices.forEach(c -> all.add(Variable.choice(c.key(), c.names(), c.drawn())));
    return all;
  }

  @Override
  public List<String> aims() {
    return options.get(0).objective().aims();
  }

  @Override
  public List<String> limits() {
    return options.get(0).objective().limits();
  }

  @Override
  public double tieResolution() {
    return options.get(0).objective().tieResolution();
  }

  @Override
  public Worker newWorker() {
    return new OptionWorker();
  }

  @Override
  public void close() {
    options.forEach(option -> option.preparation().close());
  }

  private final class OptionWorker implements Worker {

    private final List<Worker> workers =
        options.stream().map(option -> option.objective().newWorker()).toList();
    private final int parts = workers.stream().mapToInt(Worker::partCount).min().orElse(0);

    @Override
    public Verdict judge(double[] values) {
      List<Double> list = boxed(values);
      int picked = combination(list);
      return workers.get(picked).judge(options.get(picked).own(numbers, list));
    }

    @Override
    public int partCount() {
      return parts;
    }

    @Override
    public boolean parts(double[] values, double[] into, double[][] gradient) {
      List<Double> list = boxed(values);
      Option option = options.get(combination(list));
      double[] own = option.own(numbers, list);
      double[][] inner = new double[into.length][own.length];
      Worker worker = workers.get(combination(list));
      if (parts == 0 || !worker.parts(own, into, inner)) {
        return false;
      }
      for (int part = 0; part < into.length; part++) {
        Arrays.fill(gradient[part], 0);
        for (int i = 0; i < own.length; i++) {
          int column = index(numbers, option.varied().variables().get(i).key());
          gradient[part][column] = inner[part][i];
        }
      }
      return true;
    }

    private static List<Double> boxed(double[] values) {
      return Arrays.stream(values).boxed().toList();
    }

    @Override
    public void close() {
      workers.forEach(Worker::close);
    }
  }
}
