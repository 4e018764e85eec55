package evensun.scenario;

/**
 * The wavelengths of a calculation.
 *
 * @param fromNm first wavelength in nm, greater than 0
 * @param toNm last wavelength in nm, at least {@code fromNm}
 * @param stepNm step in nm, greater than 0; the range is a multiple of it
 * @param place where it stands
 */
public record GridSpec(double fromNm, double toNm, double stepNm, Place place) {}
