package evensun.cli;

import evensun.scenario.InputException;
import evensun.scenario.Place;
import evensun.scenario.reader.ScenarioSchema;
import evensun.scenario.reader.Templates;
import evensun.scenario.tree.Nearest;
import evensun.scenario.tree.Shown;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.FileAlreadyExistsException;
import java.nio.file.Files;
import java.nio.file.InvalidPathException;
import java.nio.file.Path;
import java.nio.file.StandardOpenOption;
import java.util.Map;
import picocli.CommandLine.Command;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;
import tools.jackson.databind.json.JsonMapper;

/** {@code evensun new}: a commented scenario to start from. */
@Command(
    addMethodSubcommands = false,
    name = "new",
    description =
        "Writes a commented scenario to start from, and beside it the schema with which editors"
            + " complete and check it.",
    footer = {"", "Example:", "  evensun new my-cell.yaml --like four-terminal"})
final class NewCommand extends BaseCommand {

  @Parameters(paramLabel = "FILE", description = "File to write, such as my-cell.yaml.")
  String file;

  @Option(
      names = "--like",
      paramLabel = "NAME",
      description =
          "What it is like: planar (default), textured-two-junction, all-thin-film, three-junction or"
              + " four-terminal.")
  String like = Templates.USUAL;

  @Override
  public Integer call() {
    String text =
        Templates.text(like)
            .orElseThrow(
                () ->
                    new InputException(
                        Place.option("--like"),
                        "there is no template "
                            + Shown.quoted(like)
                            + Nearest.hint(like, Templates.names().keySet())));
    Path target = target();
    Path schema = target.resolveSibling(Templates.SCHEMA_FILE);
    write(target, text);
    boolean schemaWritten = writeSchema(schema);
    console().out().print(global().json() ? asJson(schema) : summary(schemaWritten));
    return ExitStatus.DONE;
  }

  private Path target() {
    Path target;
    try {
      target = Path.of(file);
    } catch (InvalidPathException e) {
      throw wrong("is not the name of a file: " + e.getReason());
    }
    if (!file.matches(".*[^/\\\\]\\.ya?ml")) {
      throw wrong("a scenario is YAML; choose a name that ends in .yaml");
    }
    Path folder = target.toAbsolutePath().normalize().getParent();
    if (folder == null || !Files.isDirectory(folder)) {
      throw wrong("there is no such folder; create it first");
    }
    return target;
  }

  private void write(Path target, String text) {
    try {
      Files.writeString(
          target,
          named(text),
          StandardCharsets.UTF_8,
          StandardOpenOption.CREATE_NEW,
          StandardOpenOption.WRITE);
    } catch (FileAlreadyExistsException e) {
      throw wrong("exists already and is left as it is; choose another name");
    } catch (IOException e) {
      throw wrong("cannot be written; check the permissions of its folder");
    }
  }

  /** Puts the name of the file into the commands that the comments show. */
  private String named(String text) {
    boolean disturbing = file.codePoints().anyMatch(Shown::isDisturbing);
    return disturbing ? text : text.replace(" FILE ", " " + CommandText.quoted(file) + " ");
  }

  /** The schema is ours to renew; a file of the same name that is not ours stays. */
  private boolean writeSchema(Path schema) {
    try {
      if (Files.exists(schema) && !Files.readString(schema).contains(ScenarioSchema.ID)) {
        return false;
      }
      Files.writeString(schema, ScenarioSchema.text(), StandardCharsets.UTF_8);
      return true;
    } catch (IOException e) {
      return false;
    }
  }

  private String summary(boolean schemaWritten) {
    Map<String, String> names = Templates.names();
    return """
        %s: %s
        %sNext: evensun assess %s
        """
        .formatted(
            file,
            names.get(like),
            schemaWritten
                ? "Editors that know JSON Schema check it with " + Templates.SCHEMA_FILE + ".\n"
                : "",
            CommandText.quoted(file));
  }

  private String asJson(Path schema) {
    return JsonMapper.shared()
            .createObjectNode()
            .put("file", file)
            .put("like", like)
            .put("schema", schema.toString())
            .toPrettyString()
        + "\n";
  }

  private InputException wrong(String message) {
    return new InputException(Place.of(file), message);
  }
}
