package evensun.spi;

/**
 * How the share of the lower end changes through a graded layer: a function s(x) of the relative
 * depth x below the upper face, both in [0, 1].
 */
public sealed interface Profile {

  /**
   * Share of the lower end.
   *
   * @param x depth below the upper face over thickness, in [0, 1]
   * @return in [0, 1]
   */
  double at(double x);

  /** s = x. */
  record Linear() implements Profile {
    @Override
    public double at(double x) {
      return x;
    }
  }

  /**
   * s = x^exponent.
   *
   * @param exponent greater than 0
   */
  record Power(double exponent) implements Profile {

    public Power {
      require(exponent > 0 && exponent < 1e3, "exponent must be in (0, 1000) but was " + exponent);
    }

    @Override
    public double at(double x) {
      return Math.pow(x, exponent);
    }
  }

  /**
   * A hyperbolic tangent about {@code centre}, stretched so that s(0) = 0 and s(1) = 1.
   *
   * @param centre relative depth of the steepest place, in [0, 1]
   * @param width relative width of the transition, greater than 0
   */
  record Tanh(double centre, double width) implements Profile {

    public Tanh {
      require(centre >= 0 && centre <= 1, "centre must be in [0, 1] but was " + centre);
      require(width >= 1e-3 && width <= 1e3, "width must be in [0.001, 1000] but was " + width);
    }

    @Override
    public double at(double x) {
      double low = Math.tanh(-centre / width);
      double high = Math.tanh((1 - centre) / width);
      return (Math.tanh((x - centre) / width) - low) / (high - low);
    }
  }

  /**
   * Straight lines between points.
   *
   * @param depth relative depths, increasing, from 0 to 1
   * @param share share of the lower end at each depth, in [0, 1]
   */
  record Table(Samples depth, Samples share) implements Profile {

    public Table {
      int size = depth.size();
      require(size >= 2 && size == share.size(), "a table needs two points or more");
      require(depth.at(0) == 0 && depth.at(size - 1) == 1, "depths must run from 0 to 1");
      for (int i = 0; i < size; i++) {
        require(i == 0 || depth.at(i) > depth.at(i - 1), "depths must increase");
        require(
            share.at(i) >= 0 && share.at(i) <= 1,
            "share must be in [0, 1] but was " + share.at(i) + " at depth " + depth.at(i));
      }
    }

    @Override
    public double at(double x) {
      int i = 1;
      while (i < depth.size() - 1 && depth.at(i) < x) {
        i++;
      }
      double t = (x - depth.at(i - 1)) / (depth.at(i) - depth.at(i - 1));
      return share.at(i - 1) + t * (share.at(i) - share.at(i - 1));
    }
  }

  /**
   * Tapered elements that stand on the face below, tips towards the light, what is above them
   * between them: the filling fraction by the area of the cross-section.
   *
   * @param shape shape of an element
   * @param baseFraction area covered by the bases, in (0, 1]: 1 for pyramids side by side, π/4 for
   *     round bases touching on a square lattice, π/(2√3) on a hexagonal one
   */
  record MothEye(Shape shape, double baseFraction) implements Profile {

    public MothEye {
      require(
          baseFraction > 0 && baseFraction <= 1,
          "baseFraction must be in (0, 1] but was " + baseFraction);
    }

    @Override
    public double at(double x) {
      return baseFraction * (shape == Shape.PARABOLOID ? x : x * x);
    }
  }

  /** Shape of a moth-eye element. */
  enum Shape {
    /** Width grows in proportion to the distance from the tip, area with its square. */
    PYRAMID,
    /** As the pyramid, with a round base. */
    CONE,
    /** Area grows in proportion to the distance from the tip. */
    PARABOLOID
  }

  private static void require(boolean condition, String message) {
    if (!condition) {
      throw new IllegalArgumentException(message);
    }
  }
}
