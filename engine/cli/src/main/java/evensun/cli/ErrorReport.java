package evensun.cli;

import evensun.pluginhost.PluginException;
import evensun.pluginhost.PluginFault;
import evensun.scenario.Fault;
import evensun.scenario.InputException;
import evensun.spi.EvaluationFailed;
import evensun.spi.UnsupportedProblem;
import java.io.IOException;
import java.io.PrintWriter;
import java.io.StringWriter;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import java.util.concurrent.CancellationException;
import picocli.CommandLine;
import picocli.CommandLine.ParameterException;
import picocli.CommandLine.ParseResult;
import picocli.CommandLine.UnmatchedArgumentException;
import tools.jackson.databind.json.JsonMapper;
import tools.jackson.databind.node.ArrayNode;
import tools.jackson.databind.node.ObjectNode;

/** Turns whatever went wrong into one clear line each and an exit status. */
final class ErrorReport {

  private final Console console;

  ErrorReport(Console console) {
    this.console = console;
  }

  /** The command line itself is wrong. */
  int wrongCommandLine(ParameterException e, String[] args) {
    String message = message(e);
    String command = e.getCommandLine().getCommandSpec().qualifiedName();
    return tell(
        wantsJson(args),
        ExitStatus.WRONG_INPUT,
        List.of(new Line("", 0, "", message + " (see " + command + " --help)")));
  }

  private static boolean wantsJson(String[] args) {
    return List.of(args).contains("json") || List.of(args).contains("--format=json");
  }

  private static String message(ParameterException e) {
    if (e instanceof UnmatchedArgumentException unmatched) {
      List<String> suggestions = unmatched.getSuggestions();
      return "there is no command or option \"%s\"".formatted(unmatched.getUnmatched().get(0))
          + (suggestions.isEmpty() ? "" : "; did you mean " + suggestions.get(0) + "?");
    }
    return e.getMessage().replaceAll("\\s*\\R\\s*", " ");
  }

  /** A command threw. */
  int failed(Exception e, CommandLine line, ParseResult result) {
    boolean json = ((Evensun) line.getCommandSpec().root().userObject()).global.json();
    if (e instanceof InputException input) {
      return tell(json, ExitStatus.WRONG_INPUT, input.faults().stream().map(Line::of).toList());
    }
    if (e instanceof PluginException) {
      return tell(json, ExitStatus.WRONG_PLUGIN, List.of(new Line("", 0, "", e.getMessage())));
    }
    if (e instanceof UnsupportedProblem) {
      return tell(json, ExitStatus.WRONG_INPUT, List.of(new Line("", 0, "", e.getMessage())));
    }
    if (e instanceof EvaluationFailed) {
      return tell(json, ExitStatus.WRONG_PLUGIN, List.of(new Line("", 0, "", e.getMessage())));
    }
    if (e instanceof CancellationException) {
      return tell(json, ExitStatus.INTERRUPTED, List.of(new Line("", 0, "", e.getMessage())));
    }
    return defect(e, json);
  }

  /** The machine or a class gave up in the middle of a command. */
  int broken(Error e, String[] args) {
    if (e instanceof OutOfMemoryError) {
      long megabytes = Runtime.getRuntime().maxMemory() >> 20;
      String message =
          "out of memory (%d MB); take a coarser grid, or allow more with EVENSUN_JAVA_OPTS=-Xmx4g"
              .formatted(megabytes);
      return tell(
          wantsJson(args), ExitStatus.INTERNAL_ERROR, List.of(new Line("", 0, "", message)));
    }
    return defect(e, wantsJson(args));
  }

  private int defect(Throwable e, boolean json) {
    Optional<String> plugin = PluginFault.place(e);
    String message =
        plugin.isPresent()
            ? what("a solver plugin failed in " + plugin.get(), e)
                + kept(e, "the plugin", "its author")
            : what("internal error", e) + kept(e, "Evensun", "the maintainers");
    return tell(
        json,
        plugin.isPresent() ? ExitStatus.WRONG_PLUGIN : ExitStatus.INTERNAL_ERROR,
        List.of(new Line("", 0, "", message)));
  }

  private int tell(boolean json, int status, List<Line> lines) {
    for (Line line : lines) {
      console.err().println(line.text());
    }
    if (json) {
      JsonMapper mapper = JsonMapper.builder().build();
      ObjectNode root = mapper.createObjectNode();
      root.put("exitStatus", status);
      ArrayNode errors = root.putArray("errors");
      for (Line line : lines) {
        ObjectNode error = errors.addObject();
        error.put("file", line.file());
        error.put("line", line.line());
        error.put("key", line.key());
        error.put("message", line.message());
      }
      console.out().println(mapper.writeValueAsString(root));
    }
    return status;
  }

  private static String what(String where, Throwable e) {
    String said =
        e.getMessage() == null ? "" : ": " + e.getMessage().replaceAll("\\s*\\R\\s*", " ");
    return where + " (" + e.getClass().getSimpleName() + ")" + said;
  }

  /** Where to send a defect; the details go to a file, since a stack trace helps no user. */
  private static String kept(Throwable e, String whose, String receiver) {
    String defect = "; this is a defect of " + whose + ": please ";
    try {
      StringWriter trace = new StringWriter();
      e.printStackTrace(new PrintWriter(trace));
      Path file = Files.createTempFile("evensun-error-", ".txt");
      Files.writeString(file, trace.toString());
      return defect + "send " + file + " and your input to " + receiver;
    } catch (IOException io) {
      return defect + "report it to " + receiver;
    }
  }

  private record Line(String file, int line, String key, String message) {

    static Line of(Fault fault) {
      return new Line(
          fault.place().file(), fault.place().line(), fault.place().key(), fault.message());
    }

    String text() {
      if (file.isEmpty()) {
        return message;
      }
      return line > 0 ? file + ":" + line + ": " + message : file + ": " + message;
    }
  }
}
