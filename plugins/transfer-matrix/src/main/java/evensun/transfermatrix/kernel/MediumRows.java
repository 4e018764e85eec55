package evensun.transfermatrix.kernel;

import java.util.Arrays;

/**
 * What a plane wave meets in each medium, wavelength by wavelength, found anew only when a material
 * or the beam changes.
 *
 * <p>Media have places x: the M materials as layers, then the half-space in front (M) and the one
 * behind (M + 1), which are held apart because they take smaller indices along the normal.
 */
final class MediumRows {

  /** The exponent of a crossing is found as this many doublings of a short one; see Phases. */
  static final double DECAY_PARTS = 128;

  /** [x][w] turns of exp(2iκd) per nm of thickness: 2 Re q/λ. */
  final double[][] turnsPerNm;

  /** [x][w] exponent of |exp(2iκd)| per nm over {@link #DECAY_PARTS}, not above 0. */
  final double[][] decayPerNm;

  /** Admittances for s-polarised light. */
  final Admittances s;

  /** Admittances for p-polarised light. */
  final Admittances p;

  /** [x] whether a wave crosses the medium undiminished at every wavelength. */
  final boolean[] lossless;

  /** [x] differs whenever the rows of place x do. */
  final long[] version;

  private final double[] wavelengthNm;
  private final int materials;
  private final int[] material; // [x] whose rows these are
  private final long[] revision; // [x] at which they were found; 0: not at all
  private Beam beam;
  private int incidentMaterial = -1;
  private long incidentRevision;
  private long lastVersion;

  MediumRows(double[] wavelengthNm, int materials) {
    this.wavelengthNm = wavelengthNm;
    this.materials = materials;
    int places = materials + 2;
    int count = wavelengthNm.length;
    turnsPerNm = new double[places][count];
    decayPerNm = new double[places][count];
    s = new Admittances(places, count);
    p = new Admittances(places, count);
    lossless = new boolean[places];
    version = new long[places];
    material = new int[places];
    revision = new long[places];
  }

  /** The place of medium j of a layout. */
  int place(Layout layout, int j) {
    if (j == 0) {
      return materials;
    }
    return j == layout.layerCount + 1 ? materials + 1 : layout.material[j];
  }

  /** Makes the rows of all media of a layout right. */
  void refresh(Layout layout, Beam light, double[][] n, double[][] k, long[] revisions) {
    int incident = layout.material[0];
    if (!light.same(beam) || (!light.normal() && incidentChanged(incident, revisions))) {
      Arrays.fill(revision, 0);
    }
    beam = light;
    incidentMaterial = incident;
    incidentRevision = revisions[incident];
    for (int j = 0; j <= layout.layerCount + 1; j++) {
      int x = place(layout, j);
      int m = layout.material[j];
      if (revision[x] == 0 || revision[x] != revisions[m] || material[x] != m) {
        fill(x, n[m], k[m], n[incident]);
        material[x] = m;
        revision[x] = revisions[m];
        version[x] = ++lastVersion;
      }
    }
  }

  private boolean incidentChanged(int incident, long[] revisions) {
    return incident != incidentMaterial
        || revisions[incident] != incidentRevision
        || incidentRevision == 0;
  }

  private void fill(int x, double[] n, double[] k, double[] incident) {
    if (beam.normal()) {
      System.arraycopy(n, 0, s.re[x], 0, n.length);
      System.arraycopy(k, 0, s.im[x], 0, k.length);
    } else {
      double least = x < materials ? NormalIndex.LEAST_LAYER : NormalIndex.LEAST_HALF_SPACE;
      for (int w = 0; w < n.length; w++) {
        root(x, w, n[w], k[w], incident[w], least);
      }
    }
    lossless[x] = true;
    for (int w = 0; w < n.length; w++) {
      turnsPerNm[x][w] = 2 * s.re[x][w] / wavelengthNm[w];
      decayPerNm[x][w] = -4 * Math.PI / DECAY_PARTS * s.im[x][w] / wavelengthNm[w];
      lossless[x] &= s.im[x][w] == 0;
    }
    s.findCarried(x);
    if (beam.p() > 0) {
      p.fillFromIndex(x, n, k, s);
    }
  }

  /** The root of q² in the first quadrant. */
  private void root(int x, int w, double n, double k, double incident, double least) {
    double re = NormalIndex.squareRe(n, k, incident, beam.cosine());
    double im = NormalIndex.squareIm(n, k);
    double size = Math.sqrt(re * re + im * im);
    double floor = least * (n * n + k * k);
    if (size < floor) {
      s.re[x][w] = Math.sqrt(floor);
      s.im[x][w] = 0;
    } else if (re >= 0) {
      s.re[x][w] = Math.sqrt((size + re) / 2);
      s.im[x][w] = im / (2 * s.re[x][w]);
    } else {
      s.im[x][w] = Math.sqrt((size - re) / 2);
      s.re[x][w] = im / (2 * s.im[x][w]);
    }
  }
}
