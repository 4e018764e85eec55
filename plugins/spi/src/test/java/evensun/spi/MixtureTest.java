package evensun.spi;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.util.List;
import org.junit.jupiter.api.Test;

class MixtureTest {

  private static final Mixture.Component SOLID = Mixture.Component.fixed("solid", 0, 0.7);

  @Test
  void aFractionComesFromItsKnob() {
    Knob knob = new Knob(1, "fraction", "", 0, 0.6);
    Mixture.Component pores = new Mixture.Component("pores", 1, Parameter.moved(0.3, knob));
    Mixture mixture = Mixture.bruggeman(List.of(SOLID, pores));
    Design design = new Design(1, 2, 1, 2);
    design.knob[1] = 0.25;
    assertThat(mixture.knobs()).containsExactly(knob);
    assertThat(pores.fraction().in(design)).isEqualTo(0.25);
    assertThat(SOLID.fraction().in(design)).isEqualTo(0.7);
  }

  @Test
  void fractionsMustSumToOne() {
    List<Mixture.Component> components = List.of(SOLID, Mixture.Component.fixed("pores", 1, 0.2));
    assertThatThrownBy(() -> Mixture.bruggeman(components))
        .hasMessageContaining("must sum to 1 but sum to 0.89");
  }

  @Test
  void componentsNeedDifferentNames() {
    List<Mixture.Component> components = List.of(SOLID, Mixture.Component.fixed("solid", 1, 0.3));
    assertThatThrownBy(() -> Mixture.bruggeman(components))
        .hasMessageContaining("two components are named solid");
  }

  @Test
  void oneFractionMustStayFree() {
    Knob knob = new Knob(0, "fraction", "", 0, 1);
    Mixture.Component a = new Mixture.Component("a", 0, Parameter.moved(0.5, knob));
    Mixture.Component b = new Mixture.Component("b", 1, Parameter.moved(0.5, knob));
    assertThatThrownBy(() -> Mixture.bruggeman(List.of(a, b)))
        .hasMessageContaining("must have a fixed fraction");
  }
}
