package evensun.transfermatrix;

import org.apache.commons.math3.complex.Complex;
import org.apache.commons.math3.complex.ComplexField;
import org.apache.commons.math3.linear.Array2DRowFieldMatrix;
import org.apache.commons.math3.linear.ArrayFieldVector;
import org.apache.commons.math3.linear.FieldLUDecomposition;
import org.apache.commons.math3.linear.FieldMatrix;
import org.apache.commons.math3.linear.FieldVector;

/**
 * A coherent stack solved as one linear system: continuity of both tangential fields at every face,
 * for all amplitudes at once. Shares no formula with the kernels: p light is followed by its
 * magnetic field, and power comes from the Poynting vector E × H* at the faces.
 */
final class BoundaryValues {

  final double reflectance;
  final double transmittance;
  final double[] absorptance; // [l]
  final double condition; // ‖A‖·‖A⁻¹‖ in the maximum norm

  private final int layers;
  private final Complex[] other; // [j] the second tangential field of a wave over the first
  private final Complex[] phase; // [j] across the layer
  private final FieldMatrix<Complex> system;
  private final FieldVector<Complex> right;

  BoundaryValues(Sample sample, int w, double angleDeg, boolean p) {
    this(sample, w, angleDeg, p, -1, 0);
  }

  /** With a phase added to a crossing of layer {@code shifted}, its attenuation kept. */
  BoundaryValues(Sample sample, int w, double angleDeg, boolean p, int shifted, double phaseRad) {
    layers = sample.layers();
    other = new Complex[layers + 2];
    phase = new Complex[layers + 2];
    double tangential = sample.design.n[0][w] * Math.sin(Math.toRadians(angleDeg));
    double k0 = 2 * Math.PI / sample.problem.wavelengthNm().at(w);
    for (int j = 0; j < layers + 2; j++) {
      Complex square = new Complex(sample.design.n[j][w], sample.design.k[j][w]).pow(2);
      square = new Complex(square.getReal(), Math.abs(square.getImaginary()));
      Complex q = square.subtract(tangential * tangential).sqrt();
      other[j] = p ? q.divide(square) : q;
      double nm = j == 0 || j > layers ? 0 : sample.design.thicknessNm[j - 1];
      phase[j] = Complex.I.multiply(q).multiply(k0 * nm).exp();
    }
    if (shifted >= 0) {
      phase[shifted + 1] = phase[shifted + 1].multiply(Complex.I.multiply(phaseRad).exp());
    }
    int size = 2 * layers + 2;
    system = new Array2DRowFieldMatrix<>(ComplexField.getInstance(), size, size);
    right = new ArrayFieldVector<>(ComplexField.getInstance(), size);
    for (int j = 0; j <= layers; j++) {
      face(j);
    }
    var solver = new FieldLUDecomposition<>(system).getSolver();
    FieldVector<Complex> waves = solver.solve(right);
    condition = norm(system) * norm(solver.getInverse());
    reflectance = Math.pow(waves.getEntry(0).abs(), 2);
    double[] flux = new double[layers + 1];
    for (int j = 0; j <= layers; j++) {
      flux[j] = flux(waves, j);
    }
    transmittance = flux[layers];
    absorptance = new double[layers];
    for (int l = 0; l < layers; l++) {
      absorptance[l] = flux[l] - flux[l + 1];
    }
  }

  // Unknown 0 is the reflected wave; 2j - 1 and 2j are the waves down (from the upper face) and up
  // (from the lower face) of layer j; the last is the transmitted wave.
  private void face(int j) {
    if (j == 0) {
      set(0, 0, Complex.ONE, other[0].negate());
      right.setEntry(0, Complex.ONE.negate());
      right.setEntry(1, other[0].negate());
    } else {
      set(j, 2 * j - 1, phase[j], phase[j].multiply(other[j]));
      set(j, 2 * j, Complex.ONE, other[j].negate());
    }
    set(j, 2 * j + 1, Complex.ONE.negate(), other[j + 1].negate());
    if (j < layers) {
      set(j, 2 * j + 2, phase[j + 1].negate(), phase[j + 1].multiply(other[j + 1]));
    }
  }

  private void set(int face, int unknown, Complex first, Complex second) {
    system.setEntry(2 * face, unknown, first);
    system.setEntry(2 * face + 1, unknown, second);
  }

  /** Through face j, just below it. */
  private double flux(FieldVector<Complex> waves, int j) {
    Complex down = waves.getEntry(2 * j + 1);
    Complex up = j < layers ? waves.getEntry(2 * j + 2).multiply(phase[j + 1]) : new Complex(0, 0);
    Complex first = down.add(up);
    Complex second = down.subtract(up).multiply(other[j + 1]);
    return first.multiply(second.conjugate()).getReal() / other[0].getReal();
  }

  private static double norm(FieldMatrix<Complex> matrix) {
    double largest = 0;
    for (int row = 0; row < matrix.getRowDimension(); row++) {
      double total = 0;
      for (Complex entry : matrix.getRow(row)) {
        total += entry.abs();
      }
      largest = Math.max(largest, total);
    }
    return largest;
  }
}
