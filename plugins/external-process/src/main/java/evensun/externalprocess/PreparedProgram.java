package evensun.externalprocess;

import evensun.spi.Channel;
import evensun.spi.Design;
import evensun.spi.Evaluator;
import evensun.spi.Finding;
import evensun.spi.PreparedSolver;
import evensun.spi.Problem;
import evensun.spi.Severity;
import evensun.spi.UnsupportedProblem;
import java.util.List;
import java.util.concurrent.atomic.AtomicReference;
import java.util.stream.IntStream;
import tools.jackson.databind.JsonNode;
import tools.jackson.databind.node.ObjectNode;

/** A problem that a program has accepted; every evaluator has a program of its own. */
final class PreparedProgram implements PreparedSolver {

  private final Problem problem;
  private final Options options;
  private final ProgramPool pool;
  private final ObjectNode request;
  private final long[] sent;
  private final AtomicReference<ProgramProcess> first = new AtomicReference<>();
  private volatile String lastWords = "";

  private PreparedProgram(Problem problem, Design start, Options options, ProgramPool pool) {
    this.problem = problem;
    this.options = options;
    this.pool = pool;
    request = Requests.prepare(problem, start, options.others());
    sent = start.revision.clone();
  }

  static PreparedProgram of(Problem problem, Design start, Options options, ProgramPool pool) {
    PreparedProgram prepared = new PreparedProgram(problem, start, options, pool);
    try {
      prepared.first.set(prepared.acquire());
    } catch (ProgramTrouble e) {
      throw new UnsupportedProblem(e.getMessage());
    }
    return prepared;
  }

  /** A program that is ready for this problem. */
  ProgramProcess acquire() throws ProgramTrouble {
    ProgramProcess ready = first.getAndSet(null);
    if (ready != null) {
      return ready;
    }
    ProgramProcess program = pool.take(options.command());
    try {
      JsonNode answer = program.ask(request, options.limit());
      if (answer.has("unsupported")) {
        pool.giveBack(options.command(), program);
        throw new UnsupportedProblem(
            answer.get("unsupported").asString().strip().replaceAll("\\s*\\R\\s*", " "));
      }
      if (!answer.path("ready").asBoolean(false)) {
        throw program.trouble("did not answer {\"ready\": true} when asked to prepare");
      }
      return program;
    } catch (ProgramTrouble e) {
      lastWords = program.lastWords();
      program.kill();
      throw e;
    }
  }

  void release(ProgramProcess program) {
    lastWords = program.lastWords();
    pool.giveBack(options.command(), program);
  }

  /** [m] revisions of the rows that a program has that is freshly prepared. */
  long[] sent() {
    return sent.clone();
  }

  void heard(ProgramProcess program) {
    lastWords = program.lastWords();
  }

  Options options() {
    return options;
  }

  /** The program that accepted the problem may never have been asked for more. */
  @Override
  public void close() {
    ProgramProcess ready = first.getAndSet(null);
    if (ready != null) {
      release(ready);
    }
  }

  @Override
  public List<Channel> channels() {
    return IntStream.range(0, problem.layerCount()).mapToObj(Channel::of).toList();
  }

  @Override
  public Evaluator newEvaluator() {
    Answers answers =
        new Answers(problem.incidences().size(), problem.layerCount(), problem.wavelengthCount());
    return new ProgramEvaluator(this, answers);
  }

  @Override
  public List<Finding> examine(Design design) {
    String words = lastWords;
    return words.isEmpty()
        ? List.of()
        : List.of(
            new Finding(
                "program-spoke",
                Severity.NOTE,
                options.command().get(0),
                "The program wrote to standard error: " + words));
  }
}
