package evensun.transfermatrix;

import evensun.spi.UnsupportedProblem;
import java.util.Arrays;
import java.util.Locale;
import java.util.Map;
import java.util.stream.Collectors;

/**
 * What a scenario may set under {@code solver.options} for this solver.
 *
 * @param kernel {@code kernel: fast} (the default) or {@code kernel: reference}
 */
record Options(KernelKind kernel) {

  /** The kernels that ship; they differ in the last bits of a result. */
  enum KernelKind {
    /** Loops over wavelengths that the JIT compiler vectorises. */
    FAST,
    /** Plain, readable, slow: for a second opinion. Offers no gradient. */
    REFERENCE;

    String text() {
      return name().toLowerCase(Locale.ROOT);
    }
  }

  private static final String KERNEL = "kernel";

  /**
   * Reads the options.
   *
   * @throws UnsupportedProblem naming an unknown option or value and what is allowed
   */
  static Options of(Map<String, String> options) {
    for (String key : options.keySet()) {
      if (!key.equals(KERNEL)) {
        throw new UnsupportedProblem(
            "option \"%s\" is unknown to solver transfer-matrix; it takes kernel: %s"
                .formatted(key, allowed()));
      }
    }
    return new Options(kernel(options.getOrDefault(KERNEL, KernelKind.FAST.text())));
  }

  private static KernelKind kernel(String value) {
    for (KernelKind kind : KernelKind.values()) {
      if (kind.text().equals(value)) {
        return kind;
      }
    }
    throw new UnsupportedProblem(
        "option kernel of solver transfer-matrix must be %s but was \"%s\""
            .formatted(allowed(), value));
  }

  private static String allowed() {
    return Arrays.stream(KernelKind.values())
        .map(KernelKind::text)
        .collect(Collectors.joining(" or "));
  }
}
