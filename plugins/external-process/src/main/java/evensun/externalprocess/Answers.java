package evensun.externalprocess;

import evensun.spi.Response;
import java.util.Arrays;
import tools.jackson.databind.JsonNode;

/**
 * What a program answered, checked before a number of it is used.
 *
 * @param incidences I
 * @param channels C
 * @param wavelengths W
 */
record Answers(int incidences, int channels, int wavelengths) {

  /** Why a design failed, or an empty text after its answer has been taken over. */
  String take(JsonNode answer, Response into, ProgramProcess program) throws ProgramTrouble {
    if (answer.has("failed")) {
      return answer.get("failed").asString().replaceAll("\\s*\\R\\s*", " ");
    }
    double[][] reflectance = rows(answer, "reflectance", incidences, program);
    double[][] transmittance = rows(answer, "transmittance", incidences, program);
    double[][] absorptance = rows(answer, "absorptance", incidences * channels, program);
    copy(reflectance, into.reflectance);
    copy(transmittance, into.transmittance);
    copy(absorptance, into.absorptance);
    sums(into, absorptance, transmittance);
    return "";
  }

  /** Marks every wanted number as not known. */
  static void clear(Response into) {
    for (double[][] rows :
        new double[][][] {into.reflectance, into.transmittance, into.absorptance}) {
      for (int i = 0; rows != null && i < rows.length; i++) {
        if (rows[i] != null) {
          Arrays.fill(rows[i], Double.NaN);
        }
      }
    }
    if (into.sum != null) {
      Arrays.fill(into.sum, Double.NaN);
    }
  }

  private double[][] rows(JsonNode answer, String key, int count, ProgramProcess program)
      throws ProgramTrouble {
    JsonNode node = answer.get(key);
    if (node == null || node.size() != count) {
      throw program.trouble(
          "answered " + key + " with " + size(node) + " rows instead of " + count);
    }
    double[][] rows = new double[count][wavelengths];
    for (int i = 0; i < count; i++) {
      JsonNode row = node.get(i);
      if (row.size() != wavelengths) {
        throw program.trouble(
            "answered row %d of %s with %s numbers instead of %d"
                .formatted(i, key, size(row), wavelengths));
      }
      for (int w = 0; w < wavelengths; w++) {
        rows[i][w] = number(row.get(w), key, program);
      }
    }
    return rows;
  }

  private static double number(JsonNode node, String key, ProgramProcess program)
      throws ProgramTrouble {
    if (!node.isNumber()) {
      throw program.trouble(
          "answered " + ProgramProcess.shown(node.toString()) + " in " + key + ", not a number");
    }
    return node.asDouble();
  }

  private static String size(JsonNode node) {
    return node == null ? "no" : Integer.toString(node.size());
  }

  private static void copy(double[][] from, double[][] into) {
    for (int i = 0; into != null && i < from.length; i++) {
      if (into[i] != null) {
        System.arraycopy(from[i], 0, into[i], 0, from[i].length);
      }
    }
  }

  private void sums(Response into, double[][] absorptance, double[][] transmittance) {
    for (int s = 0; into.sum != null && s < into.sum.length; s++) {
      double sum = 0;
      for (int c = 0; into.weight != null && c < channels; c++) {
        sum += product(into.weight[s * channels + c], absorptance[c]);
      }
      if (into.transmittanceWeight != null) {
        sum += product(into.transmittanceWeight[s], transmittance[0]);
      }
      into.sum[s] = sum;
      if (into.sumStandardError != null) {
        into.sumStandardError[s] = 0;
      }
    }
  }

  private static double product(double[] weight, double[] row) {
    double sum = 0;
    for (int w = 0; weight != null && w < row.length; w++) {
      sum += weight[w] * row[w];
    }
    return sum;
  }
}
