package evensun.material;

import evensun.data.DecimalText;

/** Sentences about ranges of wavelengths. */
final class Ranges {

  private Ranges() {}

  static String nm(double nm) {
    return DecimalText.of(nm, 6) + " nm";
  }

  /** Refuses a grid that leaves the range of a record. */
  static void require(MaterialRecord record, double[] wavelengthNm) {
    double first = wavelengthNm[0];
    double last = wavelengthNm[wavelengthNm.length - 1];
    if (first < record.fromNm() || last > record.toNm()) {
      throw new MaterialRangeException(
          message(record.name(), record.fromNm(), record.toNm(), first, last),
          record.fromNm(),
          record.toNm());
    }
  }

  static String message(String name, double fromNm, double toNm, double gridFrom, double gridTo) {
    return "material \""
        + name
        + "\" is known from "
        + nm(fromNm)
        + " to "
        + nm(toNm)
        + " but the grid runs from "
        + nm(gridFrom)
        + " to "
        + nm(gridTo)
        + "; shorten the grid, or write extrapolate: hold in the scenario's materials to go on with"
        + " the end values";
  }
}
