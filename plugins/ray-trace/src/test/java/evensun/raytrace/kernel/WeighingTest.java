package evensun.raytrace.kernel;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.Test;

class WeighingTest {

  /** Witness: the same two meetings, calculated by hand. */
  @Test
  void twoMeetingsInARowCarryWhatTheHandFinds() {
    LightTree tree =
        new LightTree(
            new int[] {-1, 1},
            new float[] {1, 0.25f},
            new float[] {1, 2},
            new byte[] {0, 1},
            new double[] {1, 1},
            new byte[] {3, 2, 2, 1},
            new float[4],
            new float[4],
            new int[] {0, 2},
            1);
    Nodes nodes = new Nodes(new int[] {0, 1}, new float[] {0, 0.5f});
    // Node by node: R of s and p, T of s and p; one to spare.
    double[] coating = {0.1, 0.2, 0.9, 0.8, 0.3, 0.3, 0.6, 0.5, 0.5, 0.7, 0.4, 0.1, 0, 0, 0, 0};
    Attenuation attenuation = new Attenuation(tree);
    System.arraycopy(new float[] {1, 0.5f, 0.25f, 1}, 0, attenuation.absorbed, 0, 4);
    attenuation.settle(tree);
    double[] booked = new double[4];
    double[] met = new double[8];
    Weighing weighing = new Weighing();
    weighing.follow(tree, nodes, 0, 2, coating, attenuation, 0.6, 0.4, booked, met);

    // First meeting: s 0.06 and p 0.08 reflected and booked in slot 3; s 0.54 and p 0.32 go
    // through, half of both is absorbed in slot 2, s 0.27 and p 0.16 arrive.
    assertThat(booked[3]).isCloseTo(0.14, within(1e-12));
    // A quarter keeps its polarisation, and a lot of 1 in 2 doubles: s 2 · (0.0675 + 0.12).
    double s = 0.375;
    double p = 2 * (0.2025 + 0.04);
    assertThat(met)
        .containsExactly(new double[] {0.6, 0.4, s / 2, p / 2, s / 2, p / 2, 0, 0}, within(1e-12));
    double reflected = 0.4 * s + 0.5 * p;
    double through = 0.5 * s + 0.3 * p;
    assertThat(weighing.power(2)).isCloseTo(reflected, within(1e-12));
    assertThat(booked[2]).isCloseTo(0.43 + 0.25 * reflected, within(1e-12));
    assertThat(booked[1]).isCloseTo(through, within(1e-12));
  }
}
