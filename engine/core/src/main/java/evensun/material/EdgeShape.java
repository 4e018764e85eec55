package evensun.material;

import evensun.data.DataFile;

/**
 * Permittivity of an absorber on an even energy mesh, in the form that stays Kramers–Kronig
 * consistent when the absorption moves along the energy axis by δ: ε₂(E − δ), and ε₁ = r(E − δ) +
 * a(E + δ) with the resonant part r(E) = 1 + (1/π) P∫ ε₂(x)/(x − E) dx and the antiresonant part
 * a(E) = (1/π) ∫ ε₂(x)/(x + E) dx, since both integrals only see x − E and x + E.
 *
 * @param bandgapEv gap of the measured table in eV
 * @param fromEv energy of the first mesh point in eV
 * @param stepEv mesh step in eV
 * @param imaginary [i] ε₂
 * @param resonant [i] r
 * @param antiresonant [i] a
 */
@SuppressWarnings("ArrayRecordComponent")
record EdgeShape(
    double bandgapEv,
    double fromEv,
    double stepEv,
    double[] imaginary,
    double[] resonant,
    double[] antiresonant) {

  static EdgeShape load(String name) {
    DataFile file = DataFile.resource(EdgeShape.class, "shape/" + name + ".csv");
    double[] energy = file.column(0);
    return new EdgeShape(
        Double.parseDouble(file.required("bandgap-ev")),
        energy[0],
        (energy[energy.length - 1] - energy[0]) / (energy.length - 1),
        file.column(1),
        file.column(2),
        file.column(3));
  }

  /**
   * Adds a share of the permittivity of this shape moved by δ; allocates nothing.
   *
   * @param shiftEv δ in eV
   * @param share factor
   * @param energyEv [w] photon energies in eV
   * @param real [w] added to
   * @param loss [w] added to, ε₂ at least 0
   */
  void add(double shiftEv, double share, double[] energyEv, double[] real, double[] loss) {
    double perStep = 1 / stepEv;
    int last = imaginary.length - 3;
    for (int w = 0; w < energyEv.length; w++) {
      double position = (energyEv[w] - shiftEv - fromEv) * perStep;
      int i = Math.min(Math.max((int) position, 1), last);
      double t = position - i;
      double square = t * t;
      double cube = square * t;
      // Cubic through four mesh points, continuous with its slope (Catmull and Rom).
      double a = square - 0.5 * (cube + t);
      double b = 1.5 * cube - 2.5 * square + 1;
      double c = 2 * square - 1.5 * cube + 0.5 * t;
      double d = 0.5 * (cube - square);
      double lost =
          a * imaginary[i - 1] + b * imaginary[i] + c * imaginary[i + 1] + d * imaginary[i + 2];
      double near =
          a * resonant[i - 1] + b * resonant[i] + c * resonant[i + 1] + d * resonant[i + 2];
      // The antiresonant part has no edge: straight lines between mesh points miss it by 1e-6.
      double mirrored = (energyEv[w] + shiftEv - fromEv) * perStep;
      int j = Math.min(Math.max((int) mirrored, 0), last);
      double far = antiresonant[j] + (mirrored - j) * (antiresonant[j + 1] - antiresonant[j]);
      real[w] += share * (near + far);
      loss[w] += share * Math.max(0, lost);
    }
  }
}
