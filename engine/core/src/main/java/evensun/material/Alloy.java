package evensun.material;

import evensun.data.DataFile;
import java.util.ArrayList;
import java.util.List;

/**
 * An alloy between measured compositions: the permittivities of the two neighbours are read at
 * energies that bring their critical points (gap, first peak, upper end) to those of the wanted
 * composition, and mixed by composition; the share rises as 3x² − 2x³, so that n and k are smooth.
 */
final class Alloy implements GapCurves {

  private static final double STEP_EV = 0.0025;
  private static final double FIXED_EV = 4.75;

  private final List<Member> members;

  private Alloy(List<Member> members) {
    this.members = List.copyOf(members);
  }

  /** One measured composition on an even mesh of energies. */
  @SuppressWarnings("ArrayRecordComponent")
  private record Member(double gapEv, double peakEv, double fromEv, double[] real, double[] loss) {

    /** Energy at which this member is read for energy ev of an alloy with the given points. */
    double read(double ev, double alloyGapEv, double alloyPeakEv) {
      if (ev <= alloyGapEv) {
        return ev + gapEv - alloyGapEv;
      }
      if (ev <= alloyPeakEv) {
        return gapEv + (ev - alloyGapEv) * (peakEv - gapEv) / (alloyPeakEv - alloyGapEv);
      }
      return ev >= FIXED_EV
          ? ev
          : peakEv + (ev - alloyPeakEv) * (FIXED_EV - peakEv) / (FIXED_EV - alloyPeakEv);
    }

    double at(double[] values, double ev) {
      double position = Math.max(0, (ev - fromEv) / STEP_EV);
      int i = Math.min((int) position, values.length - 2);
      double t = Math.min(position - i, 1);
      return values[i] + t * (values[i + 1] - values[i]);
    }
  }

  static Alloy load(String name) {
    DataFile file = DataFile.resource(Alloy.class, "shape/" + name + ".csv");
    double[] fraction = file.column(0);
    double[][] columns = {file.column(1), file.column(2), file.column(3)};
    List<Member> members = new ArrayList<>();
    for (String points : file.values("critical-points")) {
      double[] p = DataFile.numbersIn(points);
      int from = 0;
      while (fraction[from] != p[0]) {
        from++;
      }
      int to = from;
      while (to < fraction.length && fraction[to] == p[0]) {
        to++;
      }
      members.add(member(p[1], p[2], columns, from, to));
    }
    return new Alloy(members);
  }

  private static Member member(double gapEv, double peakEv, double[][] rows, int from, int to) {
    int size = (int) ((rows[0][to - 1] - rows[0][from]) / STEP_EV) + 1;
    double[] real = new double[size];
    double[] loss = new double[size];
    int j = from;
    for (int i = 0; i < size; i++) {
      double ev = rows[0][from] + i * STEP_EV;
      while (j + 2 < to && rows[0][j + 1] <= ev) {
        j++;
      }
      double t = (ev - rows[0][j]) / (rows[0][j + 1] - rows[0][j]);
      real[i] = rows[1][j] + t * (rows[1][j + 1] - rows[1][j]);
      loss[i] = rows[2][j] + t * (rows[2][j + 1] - rows[2][j]);
    }
    return new Member(gapEv, peakEv, rows[0][from], real, loss);
  }

  @Override
  public void fill(double gapEv, double[] energyEv, double[] n, double[] k) {
    int lower = lower(gapEv);
    Member a = members.get(lower);
    Member b = members.get(lower + 1);
    double x = Math.min(Math.max((gapEv - a.gapEv()) / (b.gapEv() - a.gapEv()), 0), 1);
    double share = x * x * (3 - 2 * x);
    double peakEv = a.peakEv() + x * (b.peakEv() - a.peakEv());
    for (int w = 0; w < energyEv.length; w++) {
      double atA = a.read(energyEv[w], gapEv, peakEv);
      double atB = b.read(energyEv[w], gapEv, peakEv);
      double real = a.at(a.real(), atA);
      double loss = a.at(a.loss(), atA);
      real += share * (b.at(b.real(), atB) - real);
      loss += share * (b.at(b.loss(), atB) - loss);
      double modulus = Math.sqrt(real * real + loss * loss);
      n[w] = Math.sqrt(0.5 * (modulus + real));
      k[w] = loss > 0 ? 0.5 * loss / n[w] : 0;
    }
  }

  private int lower(double gapEv) {
    int lower = 0;
    while (lower + 2 < members.size() && members.get(lower + 1).gapEv() <= gapEv) {
      lower++;
    }
    return lower;
  }
}
