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

  /** ε₂ at an energy in eV, never below 0. */
  double imaginaryAt(double ev) {
    return Math.max(0, at(imaginary, ev));
  }

  /** r at an energy in eV. */
  double resonantAt(double ev) {
    return at(resonant, ev);
  }

  /** a at an energy in eV. */
  double antiresonantAt(double ev) {
    return at(antiresonant, ev);
  }

  /** Cubic through four mesh points, continuous with its slope (Catmull and Rom). */
  private double at(double[] values, double ev) {
    double position = (ev - fromEv) / stepEv;
    int i = Math.min(Math.max((int) position, 1), values.length - 3);
    double t = position - i;
    double a = values[i - 1];
    double b = values[i];
    double c = values[i + 1];
    double d = values[i + 2];
    return b + 0.5 * t * (c - a + t * (2 * a - 5 * b + 4 * c - d + t * (3 * (b - c) + d - a)));
  }
}
