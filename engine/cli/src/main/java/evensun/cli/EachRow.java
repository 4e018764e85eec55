package evensun.cli;

import evensun.result.Outcome;
import evensun.run.EachJob;
import evensun.run.RowTable;
import evensun.scenario.Fault;
import java.util.List;
import tools.jackson.databind.json.JsonMapper;
import tools.jackson.databind.node.ArrayNode;
import tools.jackson.databind.node.ObjectNode;

/** One line of JSON per row of {@code --each}: what was set, then currents and losses. */
final class EachRow {

  private static final JsonMapper JSON = JsonMapper.builder().build();

  private EachRow() {}

  static String line(RowTable table, EachJob.Answer answer) {
    ObjectNode line = JSON.createObjectNode();
    line.put("row", answer.row());
    ObjectNode set = line.putObject("set");
    for (int c = 0; c < table.keys().size(); c++) {
      set.put(table.keys().get(c), answer.values().get(c));
    }
    if (answer.outcome() != null) {
      outcome(line, answer.outcome());
    } else {
      errors(line.putArray("errors"), answer.faults());
    }
    return JSON.writeValueAsString(line);
  }

  private static void outcome(ObjectNode line, Outcome outcome) {
    line.put("incidentMaPerCm2", outcome.incidentMaPerCm2());
    ArrayNode subcells = line.putArray("subcells");
    for (Outcome.SubcellOutcome subcell : outcome.subcells()) {
      ObjectNode node = subcells.addObject();
      node.put("name", subcell.name());
      node.put("photocurrentMaPerCm2", subcell.photocurrentMaPerCm2());
    }
    line.put("matchedCurrentMaPerCm2", outcome.matchedCurrentMaPerCm2());
    line.put("mismatchMaPerCm2", outcome.mismatchMaPerCm2());
    line.put("limitingSubcell", outcome.limitingSubcell());
    line.set("losses", JSON.valueToTree(outcome.losses()));
  }

  private static void errors(ArrayNode errors, List<Fault> faults) {
    for (Fault fault : faults) {
      ObjectNode error = errors.addObject();
      error.put("file", fault.place().file());
      error.put("line", fault.place().line());
      error.put("message", fault.message());
    }
  }
}
