package evensun.bench.search;

import evensun.search.Interference;
import evensun.search.Problem;
import evensun.search.TestFunctions;
import evensun.search.problem.Objective;
import java.io.IOException;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;

/** Prints the tables of the search in DEVELOPERS.md. */
public final class SearchTables {

  private static final String USAGE =
      "usage: java -jar benchmarks.jar search [--seeds N] [--cold N] [PROBLEM...]";
  private static final double TOLERANCE = 0.01;

  /** Real stacks by scenario, each with its tolerance in mA cm⁻² or percent. */
  private static final Map<String, Double> STACKS =
      new LinkedHashMap<>(Map.of("planar-7", 0.002, "two-gaps-12", 0.02));

  private SearchTables() {}

  /**
   * Prints a row for each problem; {@code --cold} instead searches each stack so many times in a
   * fresh process and tells evaluations and seconds of each.
   */
  public static void main(String[] args) throws IOException, InterruptedException {
    int seeds = 20;
    int cold = 0;
    List<String> names = new ArrayList<>();
    for (int i = 0; i < args.length; i++) {
      switch (args[i]) {
        case "--seeds" -> seeds = Integer.parseInt(args[++i]);
        case "--cold" -> cold = Integer.parseInt(args[++i]);
        case "--once" -> {
          once(args[++i], Long.parseLong(args[++i]));
          return;
        }
        default -> names.add(args[i]);
      }
    }
    if (!all().containsAll(names)) {
      System.err.println(USAGE + System.lineSeparator() + "problems: " + all());
      System.exit(2);
    }
    List<String> wanted = names.isEmpty() ? all() : names;
    if (cold > 0) {
      fresh(wanted, cold);
    } else {
      table(wanted, seeds);
    }
  }

  private static List<String> all() {
    List<String> all = new ArrayList<>(functions().keySet());
    all.addAll(STACKS.keySet());
    return all;
  }

  private static void table(List<String> names, int seeds) {
    System.out.println(Comparison.HEAD);
    Map<String, Objective> functions = functions();
    for (String name : names) {
      if (STACKS.containsKey(name)) {
        try (Stack stack = Stack.open(name)) {
          print(name, stack.objective(), STACKS.get(name), seeds);
        }
      } else {
        double tolerance = name.startsWith("films") ? 0.002 : TOLERANCE;
        print(name, functions.get(name), tolerance, seeds);
      }
    }
  }

  private static void print(String name, Objective problem, double tolerance, int seeds) {
    System.out.println(Comparison.of(name, problem, tolerance, seeds).row());
  }

  /** The first search of a process, in which nothing has been compiled yet. */
  private static void once(String name, long seed) {
    try (Stack stack = Stack.open(name)) {
      System.out.println(name + " seed " + seed + ": " + Trial.run(stack.objective(), seed));
    }
  }

  private static void fresh(List<String> names, int count)
      throws IOException, InterruptedException {
    for (String name : names) {
      for (int seed = 1; seed <= count && STACKS.containsKey(name); seed++) {
        List<String> command = new ArrayList<>();
        command.add(ProcessHandle.current().info().command().orElse("java"));
        // As the program starts itself; its folder of sources is where benchmarks are run.
        command.addAll(List.of("-XX:+UseParallelGC", "-XX:LoopUnrollLimit=400"));
        command.add("@engine/dist/src/main/launcher/search.options");
        command.add("-cp");
        command.add(System.getProperty("java.class.path"));
        command.addAll(List.of(SearchTables.class.getName(), "--once", name, "" + seed));
        new ProcessBuilder(command).inheritIO().start().waitFor();
      }
    }
  }

  /** Functions whose best value is known, and a model of seven films. */
  private static Map<String, Objective> functions() {
    Map<String, Objective> problems = new LinkedHashMap<>();
    for (int n : new int[] {5, 10}) {
      problems.put("rastrigin-" + n, of(TestFunctions::rastrigin, n, -5.12, 5.12));
      problems.put("ackley-" + n, of(TestFunctions::ackley, n, -32.768, 32.768));
      problems.put("schwefel-" + n, of(TestFunctions::schwefel, n, -500, 500));
      problems.put("rosenbrock-" + n, of(TestFunctions::rosenbrock, n, -5, 10));
      problems.put("smaller-of-two-" + n, of(TestFunctions::kinked, n, -5.12, 5.12));
    }
    problems.put("films-7", new Interference(7, true));
    problems.put("films-7-values-only", new Interference(7, false));
    return problems;
  }

  private static Objective of(Problem.Value value, int n, double low, double high) {
    return Problem.of(value, Problem.box(n, low, high));
  }
}
