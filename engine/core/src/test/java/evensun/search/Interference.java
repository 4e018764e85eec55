package evensun.search;

import evensun.search.problem.Objective;
import evensun.search.problem.Variable;
import evensun.search.problem.Verdict;
import java.util.ArrayList;
import java.util.List;

/**
 * Two currents behind a pile of thin films, in single-scattering approximation: at each of 40
 * wavelengths the waves reflected at the interfaces add up with their phases; what is not reflected
 * is shared between an absorbing film and what lies below it. It has the many hills and the kink
 * between two currents of the real task, with derivatives in closed form.
 */
public final class Interference implements Objective {

  private static final int WAVELENGTHS = 40;
  private static final double[] INDEX = {1.38, 2.0, 1.7, 1.9, 2.4, 1.6, 2.1, 1.5, 2.2, 1.8};
  private final int films;
  private final boolean derivatives;

  public Interference(int films, boolean derivatives) {
    this.films = films;
    this.derivatives = derivatives;
  }

  @Override
  public List<Variable> variables() {
    List<Variable> variables = new ArrayList<>();
    for (int i = 0; i < films; i++) {
      double high = i == films - 2 ? 1000 : 200;
      variables.add(new Variable("film" + i + ".thicknessNm", "nm", 10, high, 0, 100));
    }
    return variables;
  }

  @Override
  public List<String> aims() {
    return List.of("matched-current");
  }

  @Override
  public Worker newWorker() {
    return new Films();
  }

  private final class Films implements Worker {
    private final double[] parts = new double[2];
    private final double[][] gradient = new double[2][films];
    private final double[] re = new double[films + 1];
    private final double[] im = new double[films + 1];

    @Override
    public Verdict judge(double[] values) {
      compute(values, parts, gradient);
      return Verdict.of(Math.min(parts[0], parts[1]), 0);
    }

    @Override
    public int partCount() {
      return derivatives ? 2 : 0;
    }

    @Override
    public boolean parts(double[] values, double[] out, double[][] slopes) {
      if (derivatives) {
        compute(values, out, slopes);
      }
      return derivatives;
    }

    private void compute(double[] d, double[] out, double[][] slopes) {
      out[0] = 0;
      out[1] = 0;
      for (int j = 0; j < films; j++) {
        slopes[0][j] = 0;
        slopes[1][j] = 0;
      }
      for (int w = 0; w < WAVELENGTHS; w++) {
        add(350 + 850.0 * w / WAVELENGTHS, d, out, slopes);
      }
    }

    private void add(double wavelength, double[] d, double[] out, double[][] slopes) {
      double phase = 0;
      double real = 0;
      double imaginary = 0;
      for (int j = 0; j <= films; j++) {
        double above = j == 0 ? 1 : INDEX[j - 1];
        double below = j == films ? 3.5 : INDEX[j];
        double r = (above - below) / (above + below);
        re[j] = r * Math.cos(phase);
        im[j] = r * Math.sin(phase);
        real += re[j];
        imaginary += im[j];
        phase += j < films ? 4 * Math.PI * INDEX[j] * d[j] / wavelength : 0;
      }
      int absorber = films - 2;
      double entered = 1 - 0.8 * (real * real + imaginary * imaginary);
      double alpha = wavelength < 780 ? 0.012 * Math.pow(780 - wavelength, 0.6) / 40 : 0;
      double through = Math.exp(-alpha * d[absorber]);
      double flux = 46.0 / WAVELENGTHS;
      out[0] += flux * entered * (1 - through);
      out[1] += flux * entered * through;
      double tailRe = real;
      double tailIm = imaginary;
      for (int j = 0; j < films; j++) {
        tailRe -= re[j];
        tailIm -= im[j];
        double turn = 4 * Math.PI * INDEX[j] / wavelength;
        double slope = -1.6 * turn * (imaginary * tailRe - real * tailIm);
        slopes[0][j] += flux * slope * (1 - through);
        slopes[1][j] += flux * slope * through;
      }
      slopes[0][absorber] += flux * entered * alpha * through;
      slopes[1][absorber] -= flux * entered * alpha * through;
    }
  }
}
