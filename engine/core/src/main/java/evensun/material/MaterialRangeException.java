package evensun.material;

/** A grid leaves the range of a material's data; the message says by how much and what to do. */
public final class MaterialRangeException extends RuntimeException {

  private static final long serialVersionUID = 1;

  private final double fromNm;
  private final double toNm;

  /**
   * A grid outside the data.
   *
   * @param message in one line
   * @param fromNm first wavelength of the data in nm
   * @param toNm last wavelength of the data in nm
   */
  public MaterialRangeException(String message, double fromNm, double toNm) {
    super(message);
    this.fromNm = fromNm;
    this.toNm = toNm;
  }

  /** First wavelength of the data in nm. */
  public double fromNm() {
    return fromNm;
  }

  /** Last wavelength of the data in nm. */
  public double toNm() {
    return toNm;
  }
}
