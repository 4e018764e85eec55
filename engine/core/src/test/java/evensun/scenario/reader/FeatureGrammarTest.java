package evensun.scenario.reader;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.catchThrowableOfType;
import static org.assertj.core.api.Assertions.tuple;
import static org.assertj.core.api.Assertions.within;

import com.networknt.schema.InputFormat;
import com.networknt.schema.SchemaRegistry;
import com.networknt.schema.SpecificationVersion;
import evensun.scenario.FaceSpec.RoughnessSpec;
import evensun.scenario.Fault;
import evensun.scenario.FeatureSpec.ComponentSpec;
import evensun.scenario.FeatureSpec.GradingSpec;
import evensun.scenario.FeatureSpec.MixtureSpec;
import evensun.scenario.InputException;
import evensun.scenario.LayerSpec;
import evensun.scenario.Scenario;
import evensun.scenario.SearchSpec.VarySpec;
import evensun.spi.Grading;
import evensun.spi.MixingRule;
import evensun.spi.Mixture;
import evensun.spi.Profile;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

/** Mixed, graded and rough layers as people write them; the wording is the project's own. */
class FeatureGrammarTest {

  private static final String MIXED =
      """
      evensun: 1
      title: Mixed, graded and rough
      light: {spectrum: AM1.5G}
      grid: {fromNm: 300, toNm: 1200, stepNm: 5}
      stack:
        - {medium: air}
        - {name: coating, material: fused-silica, thicknessNm: 100, mixture: {porosity: 0.3, pores: ambient}}
        - name: scaffold
          thicknessNm: 300
          mixture:
            rule: maxwell-garnett
            host: titania
            featureSizeNm: 12
            components:
              absorber: {material: lead-halide-perovskite, bandgapEv: 1.6, fraction: 0.25}
              titania: {material: titanium-dioxide}
        - name: moth-eye
          thicknessNm: 250
          grading: {from: air, to: {material: silicon-nitride}, profile: pyramid, tolerance: 1e-3}
        - {name: wafer, material: crystalline-silicon, thicknessNm: 1e5, coherence: incoherent, roughnessNm: 3, correlationLengthNm: 20}
        - {name: mirror, material: silver, roughnessNm: 5, correlationLengthNm: 9000}
      subcells:
        - {name: top, absorbers: [scaffold/absorber]}
        - {name: bottom, absorbers: [wafer]}
      connection: series
      search:
        vary:
          coating.mixture.porosity: [0, 0.5]
          scaffold/absorber.fraction: [0.1, 0.3]
          scaffold/absorber.bandgapEv: [1.55, 1.7]
      """;

  private static Scenario read(String text) {
    return ScenarioReader.read(ScenarioReaderTest.source(text));
  }

  @Test
  void aPorosityIsAMixtureOfSolidAndPores() {
    MixtureSpec coating = (MixtureSpec) read(MIXED).stack().get(0).features().get(0);
    assertThat(coating.rule()).isEqualTo(MixingRule.BRUGGEMAN);
    assertThat(coating.porous()).isTrue();
    assertThat(coating.depolarisationFactor()).isEqualTo(Mixture.SPHERE);
    assertThat(coating.components())
        .extracting(ComponentSpec::name, ComponentSpec::material)
        .containsExactly(tuple("solid", "fused-silica"), tuple("pores", "ambient"));
    assertThat(coating.components().get(0).fraction()).isCloseTo(0.7, within(1e-15));
  }

  @Test
  void oneComponentMayTakeTheRest() {
    LayerSpec scaffold = read(MIXED).stack().get(1);
    MixtureSpec mixture = (MixtureSpec) scaffold.features().get(0);
    assertThat(scaffold.material()).isEmpty();
    assertThat(mixture.host()).isEqualTo("titania");
    assertThat(mixture.featureSizeNm()).hasValue(12);
    assertThat(mixture.components().get(0).gap().value()).isEqualTo(1.6);
    assertThat(mixture.components().get(1).fraction()).isEqualTo(0.75);
  }

  @Test
  void aGradingHasTwoEndsAndAProfile() {
    GradingSpec grading = (GradingSpec) read(MIXED).stack().get(2).features().get(0);
    assertThat(grading.from().material()).isEqualTo("air");
    assertThat(grading.to().material()).isEqualTo("silicon-nitride");
    assertThat(grading.profile()).isEqualTo(new Profile.MothEye(Profile.Shape.PYRAMID, 1));
    assertThat(grading.tolerance()).isEqualTo(1e-3);
  }

  @Test
  void facesMayBeRough() {
    Scenario scenario = read(MIXED);
    RoughnessSpec wafer = (RoughnessSpec) scenario.stack().get(3).features().get(0);
    assertThat(wafer.rmsNm()).isEqualTo(3);
    assertThat(wafer.correlationLengthNm()).isEqualTo(20);
    RoughnessSpec mirror = (RoughnessSpec) scenario.exit().faces().get(0);
    assertThat(mirror.correlationLengthNm()).isEqualTo(9000);
  }

  @Test
  void fractionsVaryByTheirOwnKeys() {
    assertThat(read(MIXED).search().orElseThrow().vary())
        .extracting(VarySpec::key)
        .containsExactly(
            "coating.mixture.porosity",
            "scaffold/absorber.fraction",
            "scaffold/absorber.bandgapEv");
  }

  @ParameterizedTest
  @ValueSource(
      strings = {
        "profile: linear, rule: refractive-index",
        "profile: power, exponent: 2",
        "profile: tanh, centre: 0.4, width: 0.2",
        "profile: 'table', points: [[0, 0], [0.5, 0.9], [1, 1]]",
        "profile: cone, baseFraction: 0.9",
        "profile: paraboloid, featureSizeNm: 150",
      })
  void readerAndSchemaTakeEveryProfile(String profile) {
    String text = MIXED.replace("profile: pyramid", profile);
    assertThat(text).isNotEqualTo(MIXED);
    assertThat(read(text).stack()).hasSize(4);
    assertThat(schemaFaults(text)).isZero();
  }

  @Test
  void theUsualToleranceNeedNotBeWritten() {
    GradingSpec grading =
        (GradingSpec) read(MIXED.replace(", tolerance: 1e-3", "")).stack().get(2).features().get(0);
    assertThat(grading.tolerance()).isEqualTo(Grading.DEFAULT_TOLERANCE);
  }

  /** Each row breaks the scenario in one place; reader and schema must both refuse it. */
  @ParameterizedTest
  @CsvSource(
      delimiter = '|',
      value = {
        "7 | porosity: 0.3 | porosity: -0.3 | layer \"coating\".mixture: porosity must be in [0, 1] but was -0.3",
        "11 | rule: maxwell-garnett | rule: magic | layer \"scaffold\".mixture: rule must be one of bruggeman, maxwell-garnett, lorentz-lorenz, looyenga, wiener-parallel, wiener-series, refractive-index but was magic",
        "19 | from: air, | '' | layer \"moth-eye\".grading: from is missing: the material at the upper face, such as {material: air}",
        "19 | 'to: {material: silicon-nitride}, ' | '' | layer \"moth-eye\".grading: to is missing: the material at the lower face, such as {material: air}",
        "19 | profile: pyramid | profile: steps | layer \"moth-eye\".grading: profile must be one of linear, power, tanh, table, pyramid, cone, paraboloid but was steps",
        "20 | ', correlationLengthNm: 20' | '' | layer \"wafer\": roughnessNm needs correlationLengthNm beside it, the lateral correlation length of the face in nm",
        "20 | roughnessNm: 3 | roughnessNm: -3 | layer \"wafer\": roughnessNm must be in [0, 10000] nm but was -3",
        "7 | porosity: 0.3 | porosity: 0.3, components: {} | layer \"coating\".mixture: components and porosity exclude each other; remove it",
        "7 | 'thicknessNm: 100, mixture' | 'thicknessNm: 100, grading: {from: air, to: air, profile: linear}, mixture' | layer \"coating\": a layer takes a mixture or a grading, not both; split it into two layers",
        "15 | fraction: 0.25 | fraction: 1.25 | layer \"scaffold\": component \"absorber\": fraction must be in [0, 1] but was 1.25",
        "19 | tolerance: 1e-3 | tolerance: 0 | layer \"moth-eye\".grading: tolerance must be in [1e-8, 0.1] but was 0",
      })
  void bothRefuse(int line, String right, String wrong, String message) {
    assertThat(schemaFaults(broken(right, wrong))).isPositive();
    expect(line, right, wrong, message);
  }

  /** What a schema cannot see. */
  @ParameterizedTest
  @CsvSource(
      delimiter = '|',
      value = {
        "15 | titanium-dioxide} | 'titanium-dioxide, fraction: 0.8}' | layer \"scaffold\".mixture.components: the fractions must sum to 1 but sum to 1.05",
        "15 | ', fraction: 0.25' | '' | layer \"scaffold\".mixture.components: only one component may leave its fraction out, as the one that takes the rest, but 2 do",
        "12 | host: titania | host: titanium | layer \"scaffold\".mixture: host names \"titanium\", but there is no such component; did you mean titania?",
        "12 | rule: maxwell-garnett | rule: looyenga | layer \"scaffold\".mixture: host goes with rule: maxwell-garnett; remove it",
        "19 | profile: pyramid | 'profile: pyramid, exponent: 2' | layer \"moth-eye\".grading: exponent goes with profile: power; remove it",
        "19 | profile: pyramid | 'profile: table, points: [[0, 0], [0.5, 1]]' | layer \"moth-eye\".grading: points must run from depth 0 to depth 1, relative to the layer",
        "17 | 'name: moth-eye' | 'name: moth-eye\n    material: air' | layer \"moth-eye\": material goes into the ends of the grading; remove it",
        "23 | scaffold/absorber] | scaffold/dye] | subcell \"top\": absorbers names the component \"dye\" of layer \"scaffold\", but it has no such component; known here: absorber, titania",
        "28 | coating.mixture.porosity | coating.porosity | search.vary: coating.porosity names nothing that can vary; did you mean coating.mixture.porosity?",
      })
  void theReaderRefuses(int line, String right, String wrong, String message) {
    expect(line, right, wrong, message);
  }

  private static void expect(int line, String right, String wrong, String message) {
    InputException thrown =
        catchThrowableOfType(InputException.class, () -> read(broken(right, wrong)));
    assertThat(thrown).isNotNull();
    // Keys of search.vary and absorbers that name the broken feature may complain as well.
    List<Fault> own = thrown.faults().stream().filter(f -> f.toString().contains(message)).toList();
    assertThat(thrown.faults()).extracting(Fault::message).contains(message);
    assertThat(own).hasSize(1);
    assertThat(own.get(0).place().line()).isBetween(line - 1, line + 1);
  }

  private static String broken(String right, String wrong) {
    String text = MIXED.replace(right, wrong.replace("\\n", "\n"));
    assertThat(text).isNotEqualTo(MIXED);
    return text;
  }

  private static int schemaFaults(String text) {
    return SchemaRegistry.withDefaultDialect(SpecificationVersion.DRAFT_2020_12)
        .getSchema(ScenarioSchema.text())
        .validate(text, InputFormat.YAML)
        .size();
  }

  @Test
  void readerAndSchemaTakeTheScenarioAsItIs() {
    assertThat(read(MIXED).stack()).hasSize(4);
    assertThat(schemaFaults(MIXED)).isZero();
  }

  @Test
  void settingsReachComponents() {
    Scenario scenario =
        ScenarioReader.read(
            ScenarioReaderTest.source(MIXED),
            List.of(
                Setting.parse("--set", "scaffold/absorber.fraction=0.2"),
                Setting.parse("--set", "coating.mixture.porosity=0.5"),
                Setting.parse("--set", "moth-eye/to.material=titanium-dioxide")));
    assertThat(scenario.stack().get(1).components().get(0).fraction()).isEqualTo(0.2);
    assertThat(scenario.stack().get(1).components().get(1).fraction()).isEqualTo(0.8);
    assertThat(scenario.stack().get(0).components().get(1).fraction()).isEqualTo(0.5);
    assertThat(scenario.stack().get(2).components().get(1).material())
        .isEqualTo("titanium-dioxide");
  }
}
