package evensun.cli;

import evensun.data.TableFormatException;
import evensun.device.DeviceParameters;
import evensun.device.gaps.GapMapper;
import evensun.device.gaps.GapOptions;
import evensun.device.gaps.GapOptions.Junction;
import evensun.light.Constants;
import evensun.light.Spectra;
import evensun.light.Spectrum;
import evensun.light.SpectrumReader;
import evensun.report.gaps.GapPage;
import evensun.result.BandgapMap;
import evensun.run.ScenarioLight;
import evensun.scenario.Connection;
import evensun.scenario.InputException;
import evensun.scenario.InputFiles;
import evensun.scenario.LightSpec;
import evensun.scenario.Place;
import evensun.scenario.Saturation;
import evensun.scenario.reader.LightReader;
import evensun.scenario.reader.Setting;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.stream.Stream;
import picocli.CommandLine.Command;
import picocli.CommandLine.Option;

/** {@code evensun gaps}: which bandgaps to aim at, before any optics. */
@Command(
    addMethodSubcommands = false,
    name = "gaps",
    description = {
      "Shows which bandgaps to aim at: detailed-balance efficiency of two or three junctions.",
      "Prints the optimum and what is within 1 %% of it; --html and --csv write the whole map."
    },
    footer = {
      "",
      "Examples:",
      "  evensun gaps --fix bottom=1.12",
      "  evensun gaps --subcells 3 --html gaps.html",
      "  evensun gaps --radiative-efficiency top=0.01,bottom=0.02 --format json"
    })
final class GapsCommand extends BaseCommand {

  private static final double LOWEST_EV = 0.3;
  private static final double HIGHEST_EV = 4.4;

  @Option(names = "--subcells", paramLabel = "2|3", description = "Junctions (default: 2).")
  int subcells = 2;

  @Option(
      names = "--fix",
      paramLabel = "NAME=EV",
      description = "A fixed gap: top, middle or bottom (repeatable).")
  List<String> fix = new ArrayList<>();

  @Option(
      names = "--spectrum",
      paramLabel = "NAME|FILE",
      description =
          "AM1.5G, AM1.5D, AM0, clear-sky, blackbody or a table of your own (default: AM1.5G).")
  String spectrum = "AM1.5G";

  @Option(
      names = "--light",
      paramLabel = "KEY=VALUE",
      description =
          "A key of a scenario's light, such as airMass=2 of clear-sky or temperatureK=5800 of"
              + " blackbody; may be given again.")
  List<String> lightKeys = new ArrayList<>();

  @Option(names = "--temperature-k", paramLabel = "K", description = "Cell (default: 298.15).")
  double temperatureK = Constants.CELL_TEMPERATURE_K;

  @Option(
      names = "--concentration",
      paramLabel = "SUNS",
      description = "Factor on the light (default: 1).")
  double concentration = 1;

  @Option(
      names = "--connection",
      paramLabel = "NAME",
      description = "series, independent or parallel (default: series).")
  Connection connection = Connection.SERIES;

  @Option(
      names = "--radiative-efficiency",
      paramLabel = "[NAME=]X",
      description = "External radiative efficiency at one sun, (0, 1] (default: 1).")
  List<String> efficiency = new ArrayList<>();

  @Option(
      names = "--coupling",
      paramLabel = "[NAME=]X",
      description = "Part of the recombination that the next junction collects (default: 0).")
  List<String> coupling = new ArrayList<>();

  @Option(
      names = "--absorptance",
      paramLabel = "[NAME=]X",
      description = "Part of the light above the gap that a junction absorbs (default: 1).")
  List<String> absorptance = new ArrayList<>();

  @Option(names = "--from-ev", paramLabel = "EV", description = "Lowest gap (default: 0.5).")
  double fromEv = 0.5;

  @Option(names = "--to-ev", paramLabel = "EV", description = "Highest gap (default: 2.5).")
  double toEv = 2.5;

  @Option(names = "--step-ev", paramLabel = "EV", description = "Mesh (default: 0.01).")
  double stepEv = 0.01;

  @Option(names = "--html", paramLabel = "FILE", description = "Writes the map as a page.")
  Path html;

  @Option(names = "--csv", paramLabel = "FILE", description = "Writes every point of the map.")
  Path csv;

  private static final List<String> MODELS = List.of(LightSpec.CLEAR_SKY, LightSpec.BLACKBODY);

  private static final List<String> KNOWN =
      Stream.concat(Spectra.names().stream(), MODELS.stream()).toList();

  /** Keys of a light that a detailed balance does not know. */
  private static final List<String> NOT_HERE =
      List.of("angleDeg", "polarisation", "diffuse", "concentrationSuns");

  @Override
  public Integer call() {
    GapOptions options = options();
    BandgapMap map;
    try (GapProgress progress = new GapProgress(global().quiet ? null : console())) {
      map = GapMapper.map(options, global().threadCount(), progress);
    } catch (IllegalArgumentException e) {
      throw new InputException(Place.option("gaps"), e.getMessage());
    }
    if (html != null) {
      write("--html", html, GapPage.html(map));
    }
    if (csv != null) {
      write("--csv", csv, GapTexts.csv(map));
    }
    console().out().print(global().json() ? GapTexts.json(map) : GapTexts.text(map, html, csv));
    return ExitStatus.DONE;
  }

  private GapOptions options() {
    if (subcells != 2 && subcells != 3) {
      throw wrong("--subcells", "must be 2 or 3 but was " + subcells);
    }
    range("--temperature-k", temperatureK, 50, 1000, "K");
    range("--concentration", concentration, 1e-6, 1e5, "suns");
    range("--from-ev", fromEv, LOWEST_EV, HIGHEST_EV, "eV");
    range("--to-ev", toEv, fromEv, HIGHEST_EV, "eV");
    range("--step-ev", stepEv, 0.001, 1, "eV");
    DeviceParameters device =
        new DeviceParameters(connection, 0, temperatureK, Saturation.STEP_EDGE, concentration);
    try {
      return new GapOptions(junctions(), light(), device, fromEv, toEv, stepEv);
    } catch (IllegalArgumentException e) {
      throw wrong("gaps", e.getMessage());
    }
  }

  private List<Junction> junctions() {
    List<String> names = subcells == 2 ? GapOptions.TWO : GapOptions.THREE;
    Map<String, Double> fixed = new JunctionValues("--fix", names).read(fix, false);
    Map<String, Double> radiative = fractions("--radiative-efficiency", efficiency, names);
    Map<String, Double> coupled = fractions("--coupling", coupling, names);
    Map<String, Double> absorbed = fractions("--absorptance", absorptance, names);
    List<Junction> junctions = new ArrayList<>();
    for (String name : names) {
      double light = radiative.getOrDefault(name, 1.0);
      boolean last = name.equals("bottom");
      double handed = last ? 0 : coupled.getOrDefault(name, 0.0);
      positive("--radiative-efficiency", name, light);
      positive("--absorptance", name, absorbed.getOrDefault(name, 1.0));
      if (light + handed > 1 + 1e-12) {
        throw wrong(
            "--coupling",
            "%s: coupling and radiative efficiency must add up to at most 1 but were %s and %s; give --radiative-efficiency as well"
                .formatted(name, handed, light));
      }
      Optional<Double> gap = Optional.ofNullable(fixed.get(name));
      gap.ifPresent(ev -> range("--fix", ev, LOWEST_EV, HIGHEST_EV, "eV"));
      junctions.add(
          new Junction(
              gap.map(OptionalDouble::of).orElse(OptionalDouble.empty()),
              light,
              handed,
              absorbed.getOrDefault(name, 1.0)));
    }
    return junctions;
  }

  private static Map<String, Double> fractions(
      String option, List<String> texts, List<String> names) {
    Map<String, Double> values = new JunctionValues(option, names).read(texts, true);
    values.values().forEach(value -> range(option, value, 0, 1, ""));
    return values;
  }

  private static void positive(String option, String name, double value) {
    if (!(value > 0)) {
      throw wrong(option, name + ": must be greater than 0 but was " + value);
    }
  }

  private static void range(String option, double value, double low, double high, String unit) {
    if (!(value >= low && value <= high)) {
      throw wrong(
          option,
          String.format(
              Locale.ROOT,
              "must be in [%s, %s]%s but was %s",
              low,
              high,
              unit.isEmpty() ? "" : " " + unit,
              value));
    }
  }

  private Spectrum light() {
    boolean named = Spectra.find(spectrum).isPresent();
    if (named || MODELS.contains(spectrum)) {
      return described();
    }
    if (!lightKeys.isEmpty()) {
      throw wrong("--light", "goes with a spectrum by name, not with a table");
    }
    return table();
  }

  private Spectrum described() {
    List<Setting> keys = lightKeys.stream().map(k -> Setting.parse("--light", k)).toList();
    for (Setting key : keys) {
      if (NOT_HERE.contains(key.key())) {
        throw wrong("--light", "\"" + key.key() + "\" says nothing about a map of gaps");
      }
    }
    LightSpec light = LightReader.read("--light", spectrum, keys);
    return ScenarioLight.spectrum(light, new InputFiles(Path.of("")));
  }

  private Spectrum table() {
    Path file = Path.of(spectrum);
    if (!Files.isRegularFile(file)) {
      throw wrong(
          "--spectrum",
          "must be one of %s or a file but was \"%s\""
              .formatted(String.join(", ", KNOWN), spectrum));
    }
    try {
      return SpectrumReader.read(spectrum, Files.readString(file), Optional.empty());
    } catch (TableFormatException e) {
      throw new InputException(new Place(spectrum, e.line(), 1, ""), e.getMessage());
    } catch (IOException e) {
      throw wrong("--spectrum", "\"" + spectrum + "\" cannot be read as text: " + e.getMessage());
    }
  }

  private static void write(String option, Path file, String text) {
    try {
      Files.writeString(file, text);
    } catch (IOException e) {
      throw wrong(option, "\"" + file + "\" cannot be written: " + e.getMessage());
    }
  }

  private static InputException wrong(String option, String message) {
    return new InputException(Place.option(option), message);
  }
}
