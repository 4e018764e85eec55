package evensun.testkit;

import java.util.List;
import java.util.stream.Stream;

/** All laws of the contract. */
public final class Laws {

  private Laws() {}

  /** All laws, the telling ones first; the last measures and judges nothing. */
  public static List<Law> all() {
    return Stream.of(
            SpectrumLaws.all().stream(),
            StackLaws.all().stream(),
            FeatureLaws.all().stream(),
            RepeatLaws.all().stream(),
            CallLaws.all().stream(),
            AbilityLaws.all().stream(),
            Stream.<Law>of(new Pace()))
        .flatMap(s -> s)
        .toList();
  }
}
