package evensun.stack;

import evensun.scenario.FaceSpec.HeightMapSpec;
import evensun.scenario.InputException;
import evensun.spi.HeightMap;

/** Where the measured surfaces of a stack come from. */
@FunctionalInterface
public interface SurfaceSource {

  /**
   * A measured surface.
   *
   * @param spec as the scenario names it
   * @throws InputException when the file is no grid of heights
   */
  HeightMap heightMap(HeightMapSpec spec);
}
