package evensun.device;

import evensun.result.Electrical;
import evensun.spi.Finding;
import java.util.List;

/**
 * The electrical side of one design.
 *
 * @param electrical the numbers
 * @param findings what a reader should know about them
 */
public record DeviceAnalysis(Electrical electrical, List<Finding> findings) {

  public DeviceAnalysis {
    findings = List.copyOf(findings);
  }
}
