package evensun.externalprocess;

import java.io.BufferedWriter;
import java.io.IOException;
import java.io.InputStream;
import java.io.InputStreamReader;
import java.io.OutputStreamWriter;
import java.io.Reader;
import java.io.Writer;
import java.nio.charset.StandardCharsets;
import java.time.Duration;
import java.util.List;
import java.util.concurrent.ArrayBlockingQueue;
import java.util.concurrent.BlockingQueue;
import java.util.concurrent.TimeUnit;
import tools.jackson.core.JacksonException;
import tools.jackson.databind.JsonNode;
import tools.jackson.databind.json.JsonMapper;
import tools.jackson.databind.node.ObjectNode;

/**
 * One running program. Both of its streams are read on threads of their own, so that it never waits
 * for us to read; a flood fills no memory.
 */
final class ProgramProcess implements AutoCloseable {

  private static final int MOST_CHARACTERS = 1 << 26;
  private static final int SHOWN_CHARACTERS = 80;
  private static final int BLOCK = 8192;
  private static final long FAREWELL_MILLIS = 500;

  private static final JsonMapper JSON = JsonMapper.builder().build();

  /** A line, or why there is none. */
  private record Heard(String line, String trouble) {}

  private final String name;
  private final Process process;
  private final Writer input;
  private final Tail errors = new Tail();
  private final BlockingQueue<Heard> heard = new ArrayBlockingQueue<>(2);
  private long asked;

  private ProgramProcess(String name, Process process) {
    this.name = name;
    this.process = process;
    input =
        new BufferedWriter(
            new OutputStreamWriter(process.getOutputStream(), StandardCharsets.UTF_8));
    listen("out", this::readLines);
    listen("err", this::readErrors);
  }

  static ProgramProcess start(List<String> command) throws ProgramTrouble {
    try {
      return new ProgramProcess(
          command.get(0), new ProcessBuilder(command).redirectErrorStream(false).start());
    } catch (IOException e) {
      throw new ProgramTrouble("program " + command.get(0) + " does not start: " + e.getMessage());
    }
  }

  boolean isAlive() {
    return process.isAlive();
  }

  /** What it said last on standard error, in one line. */
  String lastWords() {
    return errors.line();
  }

  /**
   * Asks and waits for the answer, which carries the number of the question: a line too many would
   * otherwise pass for the answer to the next one.
   */
  JsonNode ask(ObjectNode request, Duration limit) throws ProgramTrouble {
    asked++;
    ObjectNode numbered = request.deepCopy();
    numbered.put("id", asked);
    JsonNode answer = object(exchange(JSON.writeValueAsString(numbered), limit));
    if (answer.path("id").asLong(-1) != asked) {
      throw trouble(
          "answered with id "
              + answer.path("id")
              + " when asked with id "
              + asked
              + "; every request gets one line, with the id of the request");
    }
    return answer;
  }

  private JsonNode object(String line) throws ProgramTrouble {
    try {
      JsonNode node = JSON.readTree(line);
      if (node.isObject()) {
        return node;
      }
    } catch (JacksonException e) {
      // Told below: the parser's words speak of tokens, the author's of lines.
    }
    throw trouble(
        "answered a line that is no JSON object: "
            + shown(line)
            + " (standard output is for answers alone, write other words to standard error)");
  }

  private String exchange(String line, Duration limit) throws ProgramTrouble {
    Thread sender = listen("in", () -> send(line));
    try {
      Heard answer = heard.poll(limit.toMillis(), TimeUnit.MILLISECONDS);
      if (answer == null) {
        throw trouble("did not answer within " + limit.toMillis() / 1e3 + " s");
      }
      if (answer.trouble() != null) {
        throw trouble(answer.trouble());
      }
      return answer.line();
    } catch (InterruptedException e) {
      Thread.currentThread().interrupt();
      throw trouble("was interrupted");
    } finally {
      sender.interrupt();
    }
  }

  ProgramTrouble trouble(String what) {
    return new ProgramTrouble("program " + name + " " + what + errors.suffix());
  }

  /** The beginning of a line, fit for a message. */
  static String shown(String line) {
    String start = line.length() > SHOWN_CHARACTERS ? line.substring(0, SHOWN_CHARACTERS) : line;
    return "\"" + start.replaceAll("\\p{Cntrl}", "?") + (start.equals(line) ? "\"" : "…\"");
  }

  /** Takes the input away, and the program itself when that does not end it. */
  @Override
  public void close() {
    try {
      process.getOutputStream().close();
      if (process.waitFor(FAREWELL_MILLIS, TimeUnit.MILLISECONDS)) {
        return;
      }
    } catch (IOException e) {
      // It is gone already, or about to be.
    } catch (InterruptedException e) {
      Thread.currentThread().interrupt();
    }
    kill();
  }

  void kill() {
    process.descendants().forEach(ProcessHandle::destroyForcibly);
    process.destroyForcibly();
  }

  private Thread listen(String what, Runnable job) {
    Thread thread = new Thread(job, "external-" + what);
    thread.setDaemon(true);
    thread.start();
    return thread;
  }

  private void send(String line) {
    try {
      input.write(line);
      input.write('\n');
      input.flush();
    } catch (IOException e) {
      // It stopped reading; that it ended shows on its output.
    }
  }

  private void readLines() {
    StringBuilder line = new StringBuilder();
    char[] block = new char[BLOCK];
    try (Reader reader = reader(process.getInputStream())) {
      for (int count = reader.read(block); count >= 0; count = reader.read(block)) {
        for (int i = 0; i < count; i++) {
          if (block[i] == '\n') {
            heard.put(new Heard(line.toString(), null));
            line.setLength(0);
          } else {
            line.append(block[i]);
          }
        }
        if (line.length() > MOST_CHARACTERS) {
          kill();
          heard.put(new Heard(null, "wrote more than 64 MB without the end of a line"));
          return;
        }
      }
      heard.put(new Heard(null, "ended with status " + process.waitFor() + " before it answered"));
    } catch (IOException e) {
      heard.offer(new Heard(null, "closed its output: " + e.getMessage()));
    } catch (InterruptedException e) {
      Thread.currentThread().interrupt();
    }
  }

  private void readErrors() {
    char[] block = new char[BLOCK];
    try (Reader reader = reader(process.getErrorStream())) {
      for (int count = reader.read(block); count >= 0; count = reader.read(block)) {
        errors.add(block, count);
      }
    } catch (IOException e) {
      // Nothing more to hear.
    }
  }

  private static Reader reader(InputStream in) {
    return new InputStreamReader(in, StandardCharsets.UTF_8);
  }
}
