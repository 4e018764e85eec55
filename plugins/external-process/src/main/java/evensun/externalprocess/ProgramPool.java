package evensun.externalprocess;

import java.util.ArrayDeque;
import java.util.Deque;
import java.util.HashMap;
import java.util.List;
import java.util.Map;

/**
 * Programs that wait for their next problem, since starting one may take far longer than an
 * evaluation. Safe for threads.
 */
final class ProgramPool {

  private static final int MOST_WAITING = Runtime.getRuntime().availableProcessors();

  private final Map<List<String>, Deque<ProgramProcess>> waiting = new HashMap<>();

  /** One that waits, or a fresh one. */
  ProgramProcess take(List<String> command) throws ProgramTrouble {
    synchronized (this) {
      Deque<ProgramProcess> idle = waiting.getOrDefault(command, new ArrayDeque<>());
      while (!idle.isEmpty()) {
        ProgramProcess program = idle.pop();
        if (program.isAlive()) {
          return program;
        }
      }
    }
    return ProgramProcess.start(command);
  }

  /** Gives one back that has answered everything it was asked. */
  void giveBack(List<String> command, ProgramProcess program) {
    synchronized (this) {
      Deque<ProgramProcess> idle = waiting.computeIfAbsent(command, c -> new ArrayDeque<>());
      if (idle.size() < MOST_WAITING && program.isAlive()) {
        idle.push(program);
        return;
      }
    }
    program.close();
  }
}
