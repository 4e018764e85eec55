package evensun.device.gaps;

import evensun.device.PowerModel;
import evensun.device.SubcellParameters;
import evensun.result.BandgapMap;
import evensun.result.BandgapMap.Point;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Locale;
import java.util.concurrent.Callable;
import java.util.concurrent.ExecutionException;
import java.util.concurrent.ExecutorService;
import java.util.concurrent.Executors;
import java.util.concurrent.Future;
import java.util.concurrent.atomic.AtomicInteger;
import java.util.function.DoubleConsumer;
import org.jspecify.annotations.Nullable;

/**
 * Detailed-balance efficiency over the gaps of two or three junctions: a step of absorptance at
 * each gap, one-sided emission. Gaps that do not fall from the top to the bottom are left out.
 *
 * <p>The map is spanned by the first and the last junction that vary; where a third one varies
 * between them, each point holds its best gap. The result does not depend on the number of threads.
 */
public final class GapMapper {

  /** Points from this part of the optimum on are equally good. */
  public static final double RIDGE = 0.99;

  private final GapOptions options;
  private final GapTables tables;
  private final int[] axes;
  private final int inner;
  private final double[][] percent;
  private final double[][] innerEv;

  private GapMapper(GapOptions options) {
    this.options = options;
    this.tables = new GapTables(options);
    List<Integer> varied = options.varied();
    this.axes = axes(varied);
    this.inner = varied.size() == 3 ? varied.get(1) : -1;
    int rows = axes.length > 0 ? tables.gapEv[axes[0]].length : 1;
    int columns = axes.length > 1 ? tables.gapEv[axes[1]].length : 1;
    this.percent = new double[rows][columns];
    this.innerEv = new double[rows][columns];
  }

  private static int[] axes(List<Integer> varied) {
    if (varied.size() < 2) {
      return varied.stream().mapToInt(Integer::intValue).toArray();
    }
    return new int[] {varied.get(0), varied.get(varied.size() - 1)};
  }

  /**
   * Makes a map.
   *
   * @param options what for
   * @param threads number of threads, at least 1
   * @param progress is told the finished part, in [0, 1], from any of the threads
   * @throws IllegalArgumentException when no gaps of the mesh fall from the top to the bottom
   */
  public static BandgapMap map(GapOptions options, int threads, DoubleConsumer progress) {
    GapMapper mapper = new GapMapper(options);
    mapper.run(threads, progress);
    return mapper.result();
  }

  private void run(int threads, DoubleConsumer progress) {
    ExecutorService pool = Executors.newFixedThreadPool(threads);
    try {
      AtomicInteger done = new AtomicInteger();
      List<Callable<Void>> rows = new ArrayList<>();
      for (int row = 0; row < percent.length; row++) {
        int r = row;
        rows.add(
            () -> {
              new Row(r).fill();
              progress.accept((double) done.incrementAndGet() / percent.length);
              return null;
            });
      }
      for (Future<Void> row : pool.invokeAll(rows)) {
        row.get();
      }
    } catch (InterruptedException e) {
      Thread.currentThread().interrupt();
      throw new IllegalStateException("the bandgap map was interrupted", e);
    } catch (ExecutionException e) {
      throw new IllegalStateException("a row of the bandgap map failed", e.getCause());
    } finally {
      pool.shutdownNow();
    }
  }

  /** One row of the map, with a worker of its own. */
  private final class Row {

    private final int row;
    private final PowerModel power;
    private final int[] choice = new int[options.junctions().size()];
    private final double[] current = new double[choice.length];
    private final double[] dark = new double[choice.length];

    Row(int row) {
      this.row = row;
      List<SubcellParameters> subcells = new ArrayList<>();
      for (int j = 0; j < choice.length; j++) {
        GapOptions.Junction junction = options.junctions().get(j);
        subcells.add(
            SubcellParameters.ideal(options.names().get(j), 1)
                .withRecombination(junction.radiativeEfficiency(), 1)
                .withCoupling(junction.coupling()));
      }
      double irradiance = options.spectrum().totalWPerM2() * options.device().suns();
      power = new PowerModel(subcells, options.device(), irradiance);
    }

    void fill() {
      if (axes.length > 0) {
        choice[axes[0]] = row;
      }
      for (int column = 0; column < percent[row].length; column++) {
        if (axes.length > 1) {
          choice[axes[1]] = column;
        }
        percent[row][column] = Double.NaN;
        innerEv[row][column] = Double.NaN;
        for (int i = 0; i < (inner < 0 ? 1 : tables.gapEv[inner].length); i++) {
          if (inner >= 0) {
            choice[inner] = i;
          }
          point(column);
        }
      }
    }

    private void point(int column) {
      for (int j = 1; j < choice.length; j++) {
        if (tables.gapEv[j][choice[j]] >= tables.gapEv[j - 1][choice[j - 1]]) {
          return;
        }
      }
      tables.fill(choice, current, dark);
      double value = power.efficiencyPercentAt(current, dark);
      if (!(percent[row][column] >= value)) {
        percent[row][column] = value;
        innerEv[row][column] = inner < 0 ? Double.NaN : tables.gapEv[inner][choice[inner]];
      }
    }
  }

  private BandgapMap result() {
    Point optimum = null;
    for (int row = 0; row < percent.length; row++) {
      for (int column = 0; column < percent[row].length; column++) {
        double value = percent[row][column];
        if (value >= 0 && (optimum == null || value > optimum.efficiencyPercent())) {
          optimum = point(row, column);
        }
      }
    }
    if (optimum == null) {
      throw new IllegalArgumentException(
          "no gaps of the mesh fall from the top to the bottom; widen the range of the mesh");
    }
    double from = RIDGE * optimum.efficiencyPercent();
    return new BandgapMap(
        optimum,
        from,
        ridge(from),
        conditions(),
        Arrays.stream(axes).mapToObj(options.names()::get).toList(),
        inner < 0 ? null : options.names().get(inner),
        Arrays.stream(axes).mapToObj(j -> boxed(tables.gapEv[j])).toList(),
        Arrays.stream(percent).map(GapMapper::holed).toList(),
        inner < 0 ? null : Arrays.stream(innerEv).map(GapMapper::holed).toList());
  }

  private Point point(int row, int column) {
    List<Double> gaps = new ArrayList<>();
    for (int j = 0; j < options.junctions().size(); j++) {
      int index = 0;
      if (axes.length > 0 && j == axes[0]) {
        index = row;
      } else if (axes.length > 1 && j == axes[1]) {
        index = column;
      }
      gaps.add(j == inner ? innerEv[row][column] : tables.gapEv[j][index]);
    }
    return new Point(List.copyOf(gaps), percent[row][column]);
  }

  private List<Point> ridge(double from) {
    List<Point> ridge = new ArrayList<>();
    boolean curve = axes.length < 2;
    int outer = curve ? percent.length : percent[0].length;
    for (int i = 0; i < outer; i++) {
      int row = i;
      if (!curve) {
        row = 0;
        for (int r = 1; r < percent.length; r++) {
          row = !(percent[row][i] >= percent[r][i]) && percent[r][i] >= 0 ? r : row;
        }
      }
      int column = curve ? 0 : i;
      if (percent[row][column] >= from) {
        ridge.add(point(row, column));
      }
    }
    return List.copyOf(ridge);
  }

  private BandgapMap.Conditions conditions() {
    List<GapOptions.Junction> junctions = options.junctions();
    List<@Nullable Double> fixed = new ArrayList<>();
    for (GapOptions.Junction junction : junctions) {
      fixed.add(junction.fixedEv().isPresent() ? (Double) junction.fixedEv().getAsDouble() : null);
    }
    return new BandgapMap.Conditions(
        options.spectrum().name(),
        options.spectrum().totalWPerM2(),
        options.device().suns(),
        options.device().temperatureK(),
        options.device().connection().name().toLowerCase(Locale.ROOT),
        options.names(),
        fixed,
        junctions.stream().map(GapOptions.Junction::radiativeEfficiency).toList(),
        junctions.stream().map(GapOptions.Junction::coupling).toList(),
        junctions.stream().map(GapOptions.Junction::absorptance).toList(),
        options.stepEv());
  }

  private static List<Double> boxed(double[] values) {
    return Arrays.stream(values).boxed().toList();
  }

  private static List<@Nullable Double> holed(double[] values) {
    List<@Nullable Double> list = new ArrayList<>();
    for (double value : values) {
      list.add(Double.isNaN(value) ? null : (Double) value);
    }
    return list;
  }
}
