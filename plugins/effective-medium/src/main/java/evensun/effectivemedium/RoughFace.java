package evensun.effectivemedium;

import evensun.spi.Roughness;

/**
 * A rough face and the model chosen for it.
 *
 * @param below index of the layer below the face; the number of layers stands for the exit medium
 * @param roughness height statistics
 * @param model which of the two models describes it, never both
 */
record RoughFace(int below, Roughness roughness, Model model) {

  /** How a rough face is described. */
  enum Model {
    /** A thin layer of both neighbours, for correlation lengths far below the wavelength. */
    MIXED_LAYER,
    /** Scalar scattering, for correlation lengths far above the wavelength. */
    SCATTERING
  }

  boolean isMixedLayer() {
    return model == Model.MIXED_LAYER;
  }
}
