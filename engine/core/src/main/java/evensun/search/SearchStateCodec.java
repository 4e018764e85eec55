package evensun.search;

import evensun.search.SearchState.Phase;
import evensun.search.problem.Candidate;
import evensun.search.problem.FailureRecord;
import evensun.search.problem.Individual;
import evensun.search.problem.Verdict;
import java.util.ArrayList;
import java.util.List;
import java.util.function.Function;
import tools.jackson.core.JacksonException;
import tools.jackson.databind.JsonNode;
import tools.jackson.databind.json.JsonMapper;
import tools.jackson.databind.node.ArrayNode;
import tools.jackson.databind.node.ObjectNode;

/**
 * A search's state as JSON. Numbers that must come back bit for bit are decimal text, which also
 * holds infinities; a row of numbers is one text, its numbers separated by spaces.
 */
public final class SearchStateCodec {

  private static final int FORMAT = 2;
  private static final JsonMapper MAPPER = JsonMapper.builder().build();

  private SearchStateCodec() {}

  /** The state as one JSON document. */
  public static String write(SearchState state) {
    ObjectNode root = MAPPER.createObjectNode();
    root.put("format", FORMAT);
    root.put("search", state.fingerprint());
    root.put("phase", state.phase().name());
    root.put("stop", state.stop().name());
    root.put("round", state.round());
    root.put("generation", state.generation());
    root.put("evaluations", state.evaluations());
    root.put("tieBreaking", state.tieBreaking());
    root.put("roundBests", text(state.roundBests()));
    root.put("unrefinedBest", Double.toString(state.unrefinedBest()));
    state.population().forEach(i -> write(i, root.withArray("population").addObject()));
    state.optima().forEach(i -> write(i, root.withArray("optima").addObject()));
    state.history().forEach(g -> write(g, root.withArray("history").addObject()));
    state.failures().forEach(f -> write(f, root.withArray("failures").addObject()));
    return MAPPER.writeValueAsString(root);
  }

  private static void write(Individual individual, ObjectNode node) {
    node.put("birth", individual.birth());
    node.put("genes", text(individual.genes()));
    write(individual.verdict(), node);
  }

  private static void write(Verdict verdict, ObjectNode node) {
    node.put("aims", text(verdict.aims()));
    node.put("tieBreak", Double.toString(verdict.tieBreak()));
    node.put("violation", Double.toString(verdict.violation()));
    node.put("slacks", text(verdict.slacks()));
    node.put("failure", verdict.failure());
  }

  private static void write(GenerationRecord generation, ObjectNode node) {
    node.put("generation", generation.generation());
    node.put("round", generation.round());
    node.put("evaluations", generation.evaluations());
    node.put(
        "figures",
        text(
            List.of(
                generation.best(),
                generation.roundBest(),
                generation.mean(),
                generation.frontGain())));
  }

  private static void write(FailureRecord failure, ObjectNode node) {
    node.put("kind", failure.kind());
    node.put("count", failure.count());
    node.put("values", text(failure.first().values()));
    write(failure.first().verdict(), node);
  }

  private static String text(List<Double> numbers) {
    StringBuilder text = new StringBuilder();
    for (double number : numbers) {
      text.append(text.isEmpty() ? "" : " ").append(number);
    }
    return text.toString();
  }

  /**
   * The state that was written.
   *
   * @throws IllegalArgumentException when the text is not a whole state of this format
   */
  public static SearchState read(String json) {
    try {
      return read(MAPPER.readTree(json));
    } catch (JacksonException | NumberFormatException broken) {
      throw new IllegalArgumentException(
          "this is not a saved search state: " + broken.getMessage(), broken);
    }
  }

  private static SearchState read(JsonNode root) {
    int format = member(root, "format").asInt();
    if (format != FORMAT) {
      throw new IllegalArgumentException(
          "the saved search state has format " + format + ", this version reads " + FORMAT);
    }
    return new SearchState(
        member(root, "search").asString(),
        Phase.valueOf(member(root, "phase").asString()),
        member(root, "round").asInt(),
        member(root, "generation").asInt(),
        member(root, "evaluations").asInt(),
        rows(root, "population", SearchStateCodec::individual),
        rows(root, "optima", SearchStateCodec::individual),
        numbers(root, "roundBests"),
        number(root, "unrefinedBest"),
        rows(root, "history", SearchStateCodec::generation),
        rows(root, "failures", SearchStateCodec::failure),
        member(root, "tieBreaking").asBoolean(),
        StopReason.valueOf(member(root, "stop").asString()));
  }

  private static Individual individual(JsonNode node) {
    return new Individual(member(node, "birth").asLong(), numbers(node, "genes"), verdict(node));
  }

  private static Verdict verdict(JsonNode node) {
    return new Verdict(
        numbers(node, "aims"),
        number(node, "tieBreak"),
        number(node, "violation"),
        numbers(node, "slacks"),
        member(node, "failure").asString());
  }

  private static GenerationRecord generation(JsonNode node) {
    List<Double> figures = numbers(node, "figures");
    if (figures.size() != 4) {
      throw new IllegalArgumentException("the saved search state has a broken history");
    }
    return new GenerationRecord(
        member(node, "generation").asInt(),
        member(node, "round").asInt(),
        member(node, "evaluations").asInt(),
        figures.get(0),
        figures.get(1),
        figures.get(2),
        figures.get(3));
  }

  private static FailureRecord failure(JsonNode node) {
    return new FailureRecord(
        member(node, "kind").asString(),
        member(node, "count").asInt(),
        new Candidate(numbers(node, "values"), verdict(node)));
  }

  private static <T> List<T> rows(JsonNode root, String name, Function<JsonNode, T> reader) {
    List<T> rows = new ArrayList<>();
    if (root.get(name) instanceof ArrayNode array) {
      array.forEach(node -> rows.add(reader.apply(node)));
    }
    return rows;
  }

  private static JsonNode member(JsonNode node, String name) {
    JsonNode member = node.get(name);
    if (member == null) {
      throw new IllegalArgumentException("the saved search state lacks \"" + name + "\"");
    }
    return member;
  }

  private static double number(JsonNode node, String name) {
    return Double.parseDouble(member(node, name).asString());
  }

  private static List<Double> numbers(JsonNode node, String name) {
    String text = member(node, name).asString();
    List<Double> numbers = new ArrayList<>();
    if (!text.isEmpty()) {
      for (String number : text.split(" ", -1)) {
        numbers.add(Double.parseDouble(number));
      }
    }
    return numbers;
  }
}
