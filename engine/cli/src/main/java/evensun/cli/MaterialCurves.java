package evensun.cli;

import evensun.material.Material;
import evensun.spi.Finding;
import java.util.ArrayList;
import java.util.List;

/**
 * n and k of a library material on a grid for people to see.
 *
 * @param material the material
 * @param bandgapEv the bandgap it is shown at; 0 when it has none
 * @param wavelengthNm wavelengths in nm
 * @param n refractive index
 * @param k extinction coefficient
 * @param findings what to know about it there
 */
record MaterialCurves(
    Material material,
    double bandgapEv,
    List<Double> wavelengthNm,
    List<Double> n,
    List<Double> k,
    List<Finding> findings) {

  private static final double FROM_NM = 280;
  private static final double TO_NM = 1800;
  private static final double STEP_NM = 5;

  MaterialCurves {
    wavelengthNm = List.copyOf(wavelengthNm);
    n = List.copyOf(n);
    k = List.copyOf(k);
    findings = List.copyOf(findings);
  }

  static MaterialCurves of(Material material, double bandgapEv) {
    double from = Math.max(FROM_NM, material.record().fromNm());
    double to = Math.min(TO_NM, material.record().toNm());
    double[] nm = new double[(int) Math.floor((to - from) / STEP_NM) + 1];
    for (int w = 0; w < nm.length; w++) {
      nm[w] = from + w * STEP_NM;
    }
    double[] n = new double[nm.length];
    double[] k = new double[nm.length];
    Material.Filler filler = material.on(nm);
    filler.fill(bandgapEv, n, k);
    List<Finding> findings = new ArrayList<>(filler.findings());
    if (material.tuning().isPresent()) {
      findings.addAll(material.findingsAt(bandgapEv));
    }
    return new MaterialCurves(material, bandgapEv, list(nm), list(n), list(k), findings);
  }

  private static List<Double> list(double[] values) {
    List<Double> list = new ArrayList<>(values.length);
    for (double value : values) {
      list.add(value);
    }
    return list;
  }

  int size() {
    return n.size();
  }

  double alphaPerCm(int w) {
    return 4e7 * Math.PI * k.get(w) / wavelengthNm.get(w);
  }

  String label() {
    String name = material.record().name();
    return material.tuning().isPresent()
        ? String.format(java.util.Locale.ROOT, "%s at %.3f eV", name, bandgapEv)
        : name;
  }
}
