package evensun.raytrace;

import static org.assertj.core.api.Assertions.assertThat;

import com.sun.management.ThreadMXBean;
import evensun.spi.Design;
import evensun.spi.Evaluator;
import evensun.spi.PreparedSolver;
import evensun.spi.Response;
import java.lang.management.ManagementFactory;
import org.junit.jupiter.api.Test;

class AllocationTest {

  private static final ThreadMXBean THREADS = (ThreadMXBean) ManagementFactory.getThreadMXBean();

  /** Witness: the virtual machine's own count. A search must not feed the collector. */
  @Test
  void searchingAllocatesNothingToSpeakOf() {
    Stacks stack = PyramidTest.device(PyramidTest.pyramids(5)).rays(16);
    try (PreparedSolver prepared = stack.prepare(new RayTraceSolver());
        Evaluator evaluator = prepared.newEvaluator()) {
      Design design = stack.design();
      Response sums = Stacks.wanted(stack.problem());
      sums.sumStandardError = null;
      sums.absorptanceStandardError = null;
      evaluate(evaluator, design, sums, 200);
      long before = THREADS.getCurrentThreadAllocatedBytes();
      evaluate(evaluator, design, sums, 50);
      // Iterators that the compiler has not yet removed; one row of a spectrum would be 384.
      assertThat((THREADS.getCurrentThreadAllocatedBytes() - before) / 50).isLessThan(200);
    }
  }

  private static void evaluate(Evaluator evaluator, Design design, Response sums, int times) {
    for (int i = 0; i < times; i++) {
      design.thicknessNm[0] *= 1.0001;
      evaluator.evaluate(design, sums);
    }
  }
}
