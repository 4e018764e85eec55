package evensun.raytrace;

import evensun.raytrace.kernel.FilmSums;
import evensun.raytrace.kernel.Weighing;
import evensun.raytrace.trace.Angles;
import evensun.spi.Design;
import evensun.spi.Evaluator;
import evensun.spi.Incidence;
import evensun.spi.Layer;
import evensun.spi.OpticalSolver;
import evensun.spi.Polarisation;
import evensun.spi.PreparedSolver;
import evensun.spi.Problem;
import evensun.spi.Response;
import evensun.spi.Samples;
import evensun.spi.Services;
import evensun.spi.Side;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Map;

/**
 * The films of a boundary against the angle, seen from one side: asked of the solver below for the
 * wavelengths that come to it, and kept while nothing about them changes. Owned by one thread.
 */
final class CoatingTable implements AutoCloseable {

  /** Directions per question: the solver below keeps what materials decide for so many. */
  private static final int NODES_PER_QUESTION = 7;

  private final Problem problem;
  private final Device device;
  private final int boundary;
  private final List<Integer> films;
  private final int[] wavelengths;
  private final Question[] questions;
  private final Design films1;
  private final long[] seen; // [material of the question] revision
  private final double[] thickness; // [film] as answered last
  private final int first; // node
  private final double[][] met; // [2 · node + polarisation][i] power that met the films
  private final double[] staying; // [i] in one film
  private final double[] rest; // [i] neither reflected nor transmitted, nor in a film
  private final int from; // medium
  private boolean fresh;

  /** Some directions asked together. */
  private record Question(
      int firstNode, int nodes, PreparedSolver prepared, Evaluator evaluator, Response answer) {}

  CoatingTable(Problem problem, Device device, Angles.Table table, Services services) {
    this.problem = problem;
    this.device = device;
    boundary = table.boundary();
    wavelengths = table.lit();
    films = device.boundaries().get(boundary).films();
    seen = new long[films.size() + 2];
    thickness = new double[films.size()];
    OpticalSolver below = TransferMatrix.from(services);
    Problem question = question();
    films1 = Design.of(question);
    for (int f = 0; f < films.size(); f++) {
      films1.material[f] = f + 2;
    }
    double[] cosines = table.cosines();
    first = table.first();
    met = new double[2 * cosines.length][wavelengths.length];
    staying = new double[wavelengths.length];
    rest = new double[wavelengths.length];
    from = boundary + (table.fromBelow() ? 1 : 0);
    Side side = table.fromBelow() ? Side.REAR : Side.FRONT;
    questions = new Question[(cosines.length + NODES_PER_QUESTION - 1) / NODES_PER_QUESTION];
    for (int at = 0; at < cosines.length; at += NODES_PER_QUESTION) {
      int end = Math.min(cosines.length, at + NODES_PER_QUESTION);
      List<Incidence> incidences = incidences(Arrays.copyOfRange(cosines, at, end), side);
      PreparedSolver prepared =
          below.prepare(question.withIncidences(incidences), films1, services);
      Response answer = Response.spectra(incidences.size(), films.size(), wavelengths.length);
      questions[at / NODES_PER_QUESTION] =
          new Question(at, end - at, prepared, prepared.newEvaluator(), answer);
    }
  }

  private Problem question() {
    double[] nm = new double[wavelengths.length];
    double[] light = new double[wavelengths.length];
    for (int i = 0; i < nm.length; i++) {
      nm[i] = problem.wavelengthNm().at(wavelengths[i]);
      light[i] = problem.incidentMaPerCm2().at(wavelengths[i]);
    }
    List<Layer> plain =
        films.stream().map(l -> Layer.plain(problem.layers().get(l).name(), true)).toList();
    return new Problem(
        Samples.of(nm),
        Samples.of(light),
        plain,
        0,
        1,
        films.size() + 2,
        0,
        List.of(Incidence.normal()),
        problem.seed(),
        problem.wantedErrorMaPerCm2(),
        Map.of());
  }

  private static List<Incidence> incidences(double[] cosines, Side side) {
    List<Incidence> incidences = new ArrayList<>();
    for (double cosine : cosines) {
      double angleDeg = cosine >= 1 ? 0 : Math.toDegrees(Math.acos(cosine));
      incidences.add(new Incidence(angleDeg, Polarisation.S, side));
      incidences.add(new Incidence(angleDeg, Polarisation.P, side));
    }
    return incidences;
  }

  /**
   * Asks again where a film or a medium has changed.
   *
   * @param into [w][4 · node + quantity] R and T of all tables, see {@link Weighing}
   */
  void refresh(Design design, double[][] into) {
    if (!takeOver(design)) {
      return;
    }
    for (Question question : questions) {
      question.evaluator().evaluate(films1, question.answer());
      for (int i = 0; i < 2 * question.nodes(); i++) {
        int at = Weighing.PER_NODE * (first + question.firstNode() + i / 2) + i % 2;
        put(question.answer().reflectance[i], at, into);
        put(question.answer().transmittance[i], at + 2, into);
      }
    }
  }

  private void put(double[] row, int at, double[][] into) {
    for (int i = 0; i < wavelengths.length; i++) {
      into[wavelengths[i]][at] = row[i];
    }
  }

  /** Copies what the films are; whether anything changed. */
  private boolean takeOver(Design design) {
    boolean changed = !fresh;
    changed |= takeOver(design, 0, device.material(design, boundary));
    changed |= takeOver(design, 1, device.material(design, boundary + 1));
    for (int f = 0; f < films.size(); f++) {
      int l = films.get(f);
      changed |= takeOver(design, f + 2, design.material[l]);
      changed |= thickness[f] != design.thicknessNm[l];
      thickness[f] = design.thicknessNm[l];
      films1.thicknessNm[f] = design.thicknessNm[l];
    }
    fresh = true;
    return changed;
  }

  private boolean takeOver(Design design, int to, int material) {
    if (seen[to] == design.revision[material] && seen[to] != 0) {
      return false;
    }
    seen[to] = design.revision[material];
    for (int i = 0; i < wavelengths.length; i++) {
      films1.n[to][i] = design.n[material][wavelengths[i]];
      films1.k[to][i] = design.k[material][wavelengths[i]];
    }
    films1.revision[to] = Design.nextRevision();
    return true;
  }

  /**
   * Keeps the light of one wavelength that met the films.
   *
   * @param all [2 · node + polarisation] of all tables
   */
  void keep(int w, double[] all) {
    int i = Arrays.binarySearch(wavelengths, w);
    for (int row = 0; i >= 0 && row < met.length; row++) {
      met[row][i] = all[2 * first + row];
    }
  }

  /**
   * Adds what stays of the light that was kept: in the films, and in the layer that it came from.
   *
   * @param into [row][w] rows of {@link LitDevice#shares}
   */
  void addStaying(double[][] into) {
    Arrays.fill(rest, 0);
    for (Question question : questions) {
      Response answer = question.answer();
      for (int i = 0; i < 2 * question.nodes(); i++) {
        double[] light = met[2 * question.firstNode() + i];
        FilmSums.addRest(light, answer.reflectance[i], answer.transmittance[i], rest, rest.length);
      }
    }
    for (int f = 0; f < films.size(); f++) {
      sumFilm(f);
      book(staying, films.get(f), into);
      for (int i = 0; i < rest.length; i++) {
        rest[i] -= staying[i];
      }
    }
    if (device.isInner(from)) {
      book(rest, device.layer(from), into);
    }
  }

  private void sumFilm(int film) {
    Arrays.fill(staying, 0);
    for (Question question : questions) {
      for (int i = 0; i < 2 * question.nodes(); i++) {
        double[] light = met[2 * question.firstNode() + i];
        double[] share = question.answer().absorptance[i * films.size() + film];
        FilmSums.add(light, share, staying, staying.length);
      }
    }
  }

  private void book(double[] power, int layer, double[][] into) {
    double[] row = into[LitDevice.LAYERS + layer];
    for (int i = 0; i < wavelengths.length; i++) {
      row[wavelengths[i]] += power[i];
    }
  }

  @Override
  public void close() {
    for (Question question : questions) {
      question.evaluator().close();
      question.prepared().close();
    }
  }
}
