package evensun.effectivemedium;

import evensun.spi.Grading;
import evensun.spi.Mixture;

/** What a layer as drawn consists of. */
sealed interface Body {

  /** Number of plain layers that stand for it. */
  int pieces();

  /** One material. */
  record Plain() implements Body {
    @Override
    public int pieces() {
      return 1;
    }
  }

  /** A mixture, the same at every depth. */
  record Mixed(Mixture mixture) implements Body {
    @Override
    public int pieces() {
      return 1;
    }
  }

  /** A grading, cut into slices. */
  record Graded(Grading grading, Slices slices) implements Body {
    @Override
    public int pieces() {
      return slices.count();
    }
  }
}
