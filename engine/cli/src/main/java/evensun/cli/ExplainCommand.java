package evensun.cli;

import evensun.finding.Explanation;
import evensun.finding.Explanations;
import evensun.scenario.InputException;
import evensun.scenario.Place;
import evensun.scenario.tree.Nearest;
import evensun.scenario.tree.Shown;
import java.util.List;
import org.jspecify.annotations.Nullable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Parameters;
import tools.jackson.databind.json.JsonMapper;
import tools.jackson.databind.node.ArrayNode;
import tools.jackson.databind.node.ObjectNode;

/** {@code evensun explain}: what a finding means. */
@Command(
    addMethodSubcommands = false,
    name = "explain",
    description =
        "Says what a finding means, what it does to the result, and what to do. Without a code it"
            + " lists all of them.",
    footer = {"", "Example:", "  evensun explain not-balanced"})
final class ExplainCommand extends BaseCommand {

  private static final int WIDTH = 96;

  @Parameters(
      arity = "0..1",
      paramLabel = "CODE",
      description = "Code of a finding, such as not-balanced.")
  @Nullable String code;

  @Override
  public Integer call() {
    boolean json = global().json();
    if (code == null) {
      List<Explanation> all = Explanations.codes().stream().map(ExplainCommand::find).toList();
      console().out().print(json ? asJson(all) : list(all));
    } else {
      Explanation one = find(code);
      console().out().print(json ? asJson(one) + "\n" : text(one));
    }
    return ExitStatus.DONE;
  }

  private static Explanation find(String code) {
    return Explanations.of(code)
        .orElseThrow(
            () ->
                new InputException(
                    Place.option("CODE"),
                    "no finding is called "
                        + Shown.quoted(code)
                        + Nearest.of(code, Explanations.codes())
                            .map(c -> "; did you mean " + c + "?")
                            .orElse("; evensun explain lists all codes")));
  }

  private static String list(List<Explanation> all) {
    StringBuilder text = new StringBuilder();
    for (Explanation one : all) {
      text.append(one.code()).append('\n').append(indented(one.means()));
    }
    return text.toString();
  }

  private static String text(Explanation one) {
    return one.code()
        + "\n\nWhat it means\n"
        + indented(one.means())
        + "\nWhat it does to the result\n"
        + indented(one.effect())
        + "\nWhat to do\n"
        + indented(one.remedy());
  }

  /** Breaks a text into lines of at most the width, each moved in by two. */
  static String indented(String text) {
    StringBuilder lines = new StringBuilder(" ");
    int column = 1;
    for (String word : text.split(" ")) {
      if (column + 1 + word.length() > WIDTH && column > 1) {
        lines.append("\n ");
        column = 1;
      }
      lines.append(' ').append(word);
      column += 1 + word.length();
    }
    return lines.append('\n').toString();
  }

  private static String asJson(List<Explanation> all) {
    ArrayNode array = JsonMapper.shared().createArrayNode();
    all.forEach(one -> array.add(asJson(one)));
    return array.toPrettyString() + "\n";
  }

  private static ObjectNode asJson(Explanation one) {
    return JsonMapper.shared()
        .createObjectNode()
        .put("code", one.code())
        .put("means", one.means())
        .put("effect", one.effect())
        .put("do", one.remedy());
  }
}
