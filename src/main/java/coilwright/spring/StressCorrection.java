package coilwright.spring;

import coilwright.source.Citation;
import coilwright.source.Source;
import coilwright.unit.Require;

/**
 * The factor that raises the torsion stress of a straight bar to the greatest shear stress at the
 * inside of a coil: curvature and direct shear together.
 */
public enum StressCorrection {
  /** K_W = (4C - 1)/(4C - 4) + 0.615/C. */
  WAHL("wahl", "Wahl", Citation.remembered(Source.WAHL, "curvature correction factor")) {
    @Override
    double factor(double c) {
      return (4 * c - 1) / (4 * c - 4) + 0.615 / c;
    }

    @Override
    public double leastStressIndex() {
      return 1 + Math.sqrt(0.75); // d(C K)/dC = 0: 16 C^2 - 32 C + 4 = 0
    }
  },
  /** K_B = (4C + 2)/(4C - 3); the factor k of EN 13906-1 is the same. */
  BERGSTRAESSER(
      "bergstraesser", "Bergstraesser", Citation.remembered(Source.SHIGLEY, "equation 10-5")) {
    @Override
    double factor(double c) {
      return (4 * c + 2) / (4 * c - 3);
    }

    @Override
    public double leastStressIndex() {
      return 0.75 + Math.sqrt(0.9375); // d(C K)/dC = 0: 16 C^2 - 24 C - 6 = 0
    }
  };

  private final String id;
  private final String author;
  private final Citation citation;

  StressCorrection(String id, String author, Citation citation) {
    this.id = id;
    this.author = author;
    this.citation = citation;
  }

  abstract double factor(double c);

  /**
   * The spring index at which the corrected stress of a given force is least: below it a tighter
   * coil is stressed more, above it a wider one.
   *
   * @return C [-]
   */
  public abstract double leastStressIndex();

  /**
   * The correction factor.
   *
   * @param springIndex C = D/d [-], above 1
   * @return K [-]
   * @throws IllegalArgumentException if the index is not above 1 and finite
   */
  public double at(double springIndex) {
    return factor(Require.above(springIndex, 1, "spring index", "-"));
  }

  /** The id used in problem files. */
  public String id() {
    return id;
  }

  /** The author's name, without accents. */
  public String author() {
    return author;
  }

  /** Where the factor is published. */
  public Citation citation() {
    return citation;
  }
}
