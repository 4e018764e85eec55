package evensun.material;

import evensun.spi.Finding;
import java.util.List;

/**
 * What a material is and where its numbers come from.
 *
 * @param name name in scenarios
 * @param title name as spoken
 * @param kind absorber, conductor, dielectric, metal, transport or encapsulant
 * @param form how it was prepared: crystal, film, how deposited
 * @param source paper or formula with DOI where there is one
 * @param year year of the source, 0 when it has none
 * @param fromNm first wavelength of the data in nm
 * @param toNm last wavelength of the data in nm
 * @param temperatureK temperature of the measurement in K
 * @param fromMemory whether the numbers were remembered and not looked up
 * @param hazards cautions for those who handle it or deposit it, one sentence each
 * @param notes what was done to the source's numbers: cleaning, extension, interpolation error
 * @param examined what an examination of the numbers found, whatever the grid
 */
public record MaterialRecord(
    String name,
    String title,
    String kind,
    String form,
    String source,
    int year,
    double fromNm,
    double toNm,
    double temperatureK,
    boolean fromMemory,
    List<String> hazards,
    List<String> notes,
    List<Finding> examined) {

  public MaterialRecord {
    hazards = List.copyOf(hazards);
    notes = List.copyOf(notes);
    examined = List.copyOf(examined);
  }
}
