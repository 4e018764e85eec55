package evensun.effectivemedium;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import evensun.spi.Channel;
import evensun.spi.Design;
import evensun.spi.Feature;
import evensun.spi.Finding;
import evensun.spi.OpticalSolver;
import evensun.spi.PreparedSolver;
import evensun.spi.Problem;
import evensun.spi.Quantity;
import evensun.spi.Response;
import evensun.spi.Roughness;
import evensun.spi.Services;
import evensun.spi.Side;
import evensun.spi.Traits;
import evensun.spi.UnsupportedProblem;
import evensun.transfermatrix.TransferMatrixSolver;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Set;
import org.junit.jupiter.api.Test;

class RoughnessTest {

  private static Stacks rough(double rmsNm, double correlationLengthNm) {
    return Stacks.on(1.6, 0)
        .layer("film", 1.5, 0, 4000, new Roughness(rmsNm, correlationLengthNm, Side.FRONT));
  }

  @Test
  void aFineRoughFaceReflectsByTheFactorOfItsVariance() {
    // Closed form: r = r0 exp(-2 k1 k2 sigma^2) for heights of normal distribution (Névot & Croce,
    // Rev. Phys. Appl. 15, 761 (1980)); a layer of the same second moment agrees to the next order,
    // x^4/6 with x = 2 k sigma = 0.13, for a face of low contrast.
    double sigma = 4;
    Stacks stack = Stacks.on(1.6, 0).at(600);
    stack.materials.set(0, new double[] {1.5, 0});
    stack.layer("same-as-exit", 1.6, 0, 500, new Roughness(sigma, 5, Side.FRONT));
    double wave = 2 * Math.PI / 600;
    double smooth = Math.pow(0.1 / 3.1, 2);
    double factor = Math.exp(-4 * (1.5 * wave) * (1.6 * wave) * sigma * sigma);
    double reflected = stack.spectra().reflectance[0][0];
    assertThat(factor).isLessThan(0.984);
    assertThat(reflected / smooth).isCloseTo(factor, within(Math.pow(0.13, 4) / 6 + 1e-5));
  }

  @Test
  void oneRoughnessIsDescribedOnce() {
    // Law of the model: a mixed layer or scattering, never both.
    Stacks fine = rough(4, 10);
    Stacks coarse = rough(40, 3000);
    assertThat(keys(fine)).contains("film.roughLayerNm").noneMatch(key -> key.contains("Haze"));
    assertThat(keys(coarse))
        .contains("film.reflectedHaze", "film.transmittedHaze")
        .doesNotContain("film.roughLayerNm");
    Stacks smooth = Stacks.on(1.6, 0).layer("film", 1.5, 0, 4000);
    assertThat(coarse.spectra().reflectance[0]).containsExactly(smooth.spectra().reflectance[0]);
    assertThat(fine.spectra().reflectance[0][0]).isNotEqualTo(smooth.spectra().reflectance[0][0]);
  }

  private static List<String> keys(Stacks stack) {
    return stack.prepare().describe(stack.design()).stream().map(Quantity::key).toList();
  }

  @Test
  void hazeIsThePhotonMeanOfTheFormula() {
    // By hand: one wavelength, from air: 1 - exp(-(4 pi 20/500)^2) = 0.22327.
    Stacks stack = rough(20, 3000).at(500);
    double haze =
        stack.prepare().describe(stack.design()).stream()
            .filter(q -> q.key().equals("film.reflectedHaze"))
            .findFirst()
            .orElseThrow()
            .value();
    assertThat(haze).isCloseTo(0.22327, within(5e-6));
  }

  @Test
  void inBetweenIsSaid() {
    assertThat(codes(rough(10, 150))).contains("roughness-between");
    assertThat(codes(rough(4, 10))).doesNotContain("roughness-between", "roughness-high");
    assertThat(codes(rough(40, 3000)))
        .contains("haze-not-followed")
        .doesNotContain("roughness-between");
    assertThat(codes(rough(80, 20))).contains("roughness-high");
    assertThat(codes(rough(900, 3000))).contains("roughness-steep");
  }

  private static List<String> codes(Stacks stack) {
    return stack.prepare().examine(stack.design()).stream().map(Finding::code).toList();
  }

  @Test
  void aScatteringFaceIsHandedToASolverThatTakesIt() {
    List<Feature> seen = new ArrayList<>();
    Stacks stack = rough(40, 3000);
    stack.options = Map.of("next", "scatterer");
    PreparedSolver prepared =
        new EffectiveMediumSolver()
            .prepare(stack.problem(), stack.design(), Stacks.services(new Scatterer(seen)));
    assertThat(seen).containsExactly(new Roughness(40, 3000, Side.FRONT));
    assertThat(prepared.examine(stack.design()))
        .noneMatch(finding -> finding.code().equals("haze-not-followed"));
  }

  /** A solver that takes rough faces, and notes them. */
  private record Scatterer(List<Feature> seen) implements OpticalSolver {

    @Override
    public String id() {
      return "scatterer";
    }

    @Override
    public Traits traits() {
      return new Traits(Set.of(Roughness.KIND), Set.of(), true, true, false);
    }

    @Override
    public PreparedSolver prepare(Problem problem, Design start, Services services) {
      problem.layers().forEach(layer -> seen.addAll(layer.features()));
      List<evensun.spi.Layer> plain =
          problem.layers().stream().map(layer -> layer.withFeatures(List.of())).toList();
      return new TransferMatrixSolver()
          .prepare(
              problem.withStack(
                  plain,
                  problem.incidentMaterial(),
                  problem.exitMaterial(),
                  problem.materialCount()),
              start,
              services);
    }
  }

  @Test
  void aFaceThicknessComesFromBothNeighbours() {
    // Law: the mean planes stay; a rough face between equal materials changes nothing.
    Stacks rough = Stacks.on(3.5, 0.2);
    rough.layer("upper", 2, 0.1, 80).layer("lower", 2, 0.1, 70, new Roughness(6, 10, Side.FRONT));
    Stacks smooth = Stacks.on(3.5, 0.2).layer("upper", 2, 0.1, 80).layer("lower", 2, 0.1, 70);
    Response a = rough.spectra();
    Response b = smooth.spectra();
    assertThat(a.reflectance[0]).containsExactly(b.reflectance[0], within(1e-13));
    for (int w = 0; w < 6; w++) {
      assertThat(a.absorptance[0][w] + a.absorptance[1][w])
          .isCloseTo(b.absorptance[0][w] + b.absorptance[1][w], within(1e-13));
    }
  }

  @Test
  void anAbsentLayerHasNoRoughFace() {
    // Limit: a layer of zero thickness is absent, its face too, and the next face looks past it.
    Stacks stack = Stacks.on(3.5, 0.2);
    stack
        .layer("upper", 2, 0.1, 80)
        .layer("absent", 1.4, 0, 0, new Roughness(6, 10, Side.FRONT))
        .layer("lower", 2, 0.1, 70, new Roughness(6, 10, Side.FRONT));
    Stacks smooth = Stacks.on(3.5, 0.2).layer("upper", 2, 0.1, 80).layer("lower", 2, 0.1, 70);
    assertThat(stack.spectra().reflectance[0])
        .containsExactly(smooth.spectra().reflectance[0], within(1e-13));
  }

  @Test
  void aLayerThinnerThanItsRoughnessIsRefused() {
    Stacks stack = Stacks.on(1.6, 0).layer("film", 1.5, 0, 5, new Roughness(8, 10, Side.FRONT));
    assertThatThrownBy(stack::prepare)
        .isInstanceOf(UnsupportedProblem.class)
        .hasMessage("layer \"film\": its rough faces need 8.0 nm, but it is 5.0 nm thick");
  }

  @Test
  void anAbsorbingExitTakesItsHalfAsTransmitted() {
    // Law: the ledger closes and the rough half of the exit belongs to nobody else.
    Stacks stack = Stacks.on(0.2, 3.4).layer("film", 1.5, 0, 100, new Roughness(4, 10, Side.REAR));
    PreparedSolver prepared = stack.prepare();
    Response r = stack.spectra(prepared, stack.design());
    assertThat(prepared.channels()).containsExactly(Channel.of(0));
    for (int w = 0; w < 6; w++) {
      assertThat(r.absorptance[0][w]).isCloseTo(0, within(1e-15));
      assertThat(r.reflectance[0][w] + r.transmittance[0][w]).isCloseTo(1, within(1e-13));
    }
  }
}
