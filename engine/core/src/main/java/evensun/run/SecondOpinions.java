package evensun.run;

import evensun.evaluation.Aim;
import evensun.evaluation.Bench;
import evensun.evaluation.Outcomes;
import evensun.evaluation.Parameter;
import evensun.evaluation.Reading;
import evensun.material.MaterialLibrary;
import evensun.pluginhost.LoadedPlugin;
import evensun.result.Opinion;
import evensun.result.Outcome.SubcellOutcome;
import evensun.scenario.GridSpec;
import evensun.scenario.InputException;
import evensun.scenario.Scenario;
import evensun.scenario.SolverSpec;
import evensun.search.problem.Candidate;
import evensun.spi.EvaluationFailed;
import evensun.spi.UnsupportedProblem;
import evensun.stack.MaterialSlot;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.HashSet;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Objects;
import java.util.Optional;
import java.util.Set;
import java.util.function.Function;

/**
 * The found design evaluated in other ways: with a finer grid, with the solver's plain twin or with
 * other rays, with every other loaded solver that takes the stack, and with every other library
 * table of its materials. The differences are an error budget of what was tried, not of everything
 * that may be wrong.
 */
final class SecondOpinions {

  private final Preparation preparation;
  private final Varied varied;
  private final Candidate found;

  SecondOpinions(Preparation preparation, Varied varied, Candidate found) {
    this.preparation = preparation;
    this.varied = varied;
    this.found = found;
  }

  List<Opinion> opinions() {
    List<Opinion> opinions = new ArrayList<>();
    Scenario scenario = preparation.stack().scenario();
    GridSpec grid = scenario.grid();
    GridSpec finer = new GridSpec(grid.fromNm(), grid.toNm(), grid.stepNm() / 2, grid.place());
    opinions.add(
        opinion(
            "numerics",
            "half the wavelength step (" + Findings.number(finer.stepNm()) + " nm)",
            scenario.withGrid(finer)));
    if (preparation.choice().statistical()) {
      opinions.add(otherRays(scenario));
    } else {
      referenceKernel(scenario, opinions);
    }
    otherSolvers(scenario, opinions);
    Set<String> names = new LinkedHashSet<>();
    preparation.stack().usedSlots().stream().map(MaterialSlot::name).forEach(names::add);
    for (String name : names) {
      if (!scenario.materials().containsKey(name)) {
        otherTables(name, scenario, opinions);
      }
    }
    return opinions;
  }

  private Opinion otherRays(Scenario scenario) {
    long seed = preparation.seed() + 1;
    return opinion("numerics", "other rays (seed " + seed + ")", scenario.withSeed(seed));
  }

  private void referenceKernel(Scenario scenario, List<Opinion> opinions) {
    SolverChoice choice = preparation.choice();
    boolean flat = choice.solver().id().equals(SolverChoice.FLAT);
    if (!flat && !choice.chain().contains(SolverChoice.FLAT)) {
      return;
    }
    Map<String, String> options = new HashMap<>(preparation.choice().options());
    options.put("kernel", "reference");
    SolverSpec reference = new SolverSpec(choice.solver().id(), options, scenario.grid().place());
    opinions.add(
        opinion("numerics", "the solver's reference kernel", scenario.withSolver(reference)));
  }

  /** Every other loaded solver that takes the stack, with its usual options. */
  private void otherSolvers(Scenario scenario, List<Opinion> opinions) {
    Set<String> used = new HashSet<>(preparation.choice().chain());
    used.add(preparation.choice().solver().id());
    used.add(SolverChoice.EFFECTIVE); // hands the films on and has no optics of its own
    for (LoadedPlugin plugin : preparation.host().loaded()) {
      if (!used.contains(plugin.solverId())) {
        SolverSpec other = new SolverSpec(plugin.solverId(), Map.of(), scenario.grid().place());
        otherSolver(other, scenario.withSolver(other)).ifPresent(opinions::add);
      }
    }
  }

  /** A solver that refuses the stack has no opinion on it; one that breaks down says why. */
  private Optional<Opinion> otherSolver(SolverSpec solver, Scenario other) {
    String what = "solver " + solver.id();
    try (Preparation prepared = Preparation.of(other, preparation.host(), () -> false)) {
      return Optional.of(opinion("numerics", what, prepared, SecondOpinions::statistics));
    } catch (UnsupportedProblem e) {
      return Optional.empty();
    } catch (EvaluationFailed e) {
      return Optional.of(new Opinion("numerics", what, null, null, String.valueOf(e.getMessage())));
    }
  }

  private static String statistics(Bench bench) {
    return Outcomes.of(bench, List.of()).subcells().stream()
        .map(SubcellOutcome::standardErrorMaPerCm2)
        .filter(Objects::nonNull)
        .max(Double::compare)
        .map(error -> "its currents carry ±%.3f mA cm⁻²".formatted(error))
        .orElse("");
  }

  private void otherTables(String name, Scenario scenario, List<Opinion> opinions) {
    for (String other : MaterialLibrary.builtIn().alternatives(name)) {
      opinions.add(
          opinion("material", name + " replaced by " + other, scenario.withMaterial(name, other)));
    }
  }

  private Opinion opinion(String kind, String what, Scenario other) {
    try (Preparation prepared = Preparation.of(other, preparation.host(), () -> false)) {
      return opinion(kind, what, prepared, bench -> "");
    } catch (InputException e) {
      // Without the place: a report names no path of the author's machine.
      return new Opinion(kind, what, null, null, e.faults().get(0).message());
    } catch (EvaluationFailed | UnsupportedProblem e) {
      return new Opinion(kind, what, null, null, String.valueOf(e.getMessage()));
    }
  }

  private Opinion opinion(
      String kind, String what, Preparation prepared, Function<Bench, String> remark) {
    Aim aim = Aims.of(prepared.stack().scenario().search().orElseThrow(), prepared.model()).first();
    try (Bench bench = prepared.model().newBench(aim.lightSums())) {
      set(prepared, bench);
      double value = aim.value(new Reading(bench).take());
      return new Opinion(
          kind, what, aim.shown(value), aim.shown(value - found.aim()), remark.apply(bench));
    }
  }

  private void set(Preparation prepared, Bench bench) {
    for (int v = 0; v < varied.parameters().size(); v++) {
      String key = varied.parameters().get(v).key();
      Parameter parameter =
          Parameter.of(key, prepared.stack())
              .orElseThrow(() -> new EvaluationFailed(key + " cannot be set with that table"));
      bench.set(parameter, found.values().get(v));
    }
  }
}
