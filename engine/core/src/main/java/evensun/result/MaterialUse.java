package evensun.result;

import java.util.List;
import org.jspecify.annotations.Nullable;

/**
 * A material as used.
 *
 * @param name name in the scenario
 * @param title as spoken
 * @param layers layers made of it
 * @param source paper, formula or file
 * @param form how it was prepared
 * @param fromNm first wavelength of its data in nm
 * @param toNm last wavelength of its data in nm
 * @param temperatureK temperature of its data in K
 * @param bandgapEv bandgap used in eV, if any
 * @param fromMemory whether its numbers were remembered and not looked up
 * @param notes what was done to the numbers
 * @param n [w] refractive index as used on the grid of the spectra
 * @param k [w] extinction coefficient as used
 */
public record MaterialUse(
    String name,
    String title,
    List<String> layers,
    String source,
    String form,
    double fromNm,
    double toNm,
    double temperatureK,
    @Nullable Double bandgapEv,
    boolean fromMemory,
    List<String> notes,
    List<Double> n,
    List<Double> k) {}
