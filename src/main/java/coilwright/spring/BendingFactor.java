package coilwright.spring;

import coilwright.source.Citation;
import coilwright.source.Source;
import coilwright.unit.Require;

/** The factor that raises the bending stress of a straight bar to that of a curved one. */
public enum BendingFactor {
  /** At the inside of the coil, Ki = (4 C^2 - C - 1)/(4 C (C - 1)): the greatest. */
  INNER(
      "inner factor Ki",
      Citation.remembered(Source.SHIGLEY, "equation 10-43, inner factor in bending")) {
    @Override
    double factor(double c) {
      return (4 * c * c - c - 1) / (4 * c * (c - 1));
    }
  },
  /** At the outside of the coil, Ko = (4 C^2 + C - 1)/(4 C (C + 1)): below one. */
  OUTER(
      "outer factor Ko",
      Citation.remembered(Source.SHIGLEY, "equation 10-43, outer factor in bending")) {
    @Override
    double factor(double c) {
      return (4 * c * c + c - 1) / (4 * c * (c + 1));
    }
  },
  /** At the inside by EN 13906-3, q = (w + 0.07)/(w - 0.75), which it uses for changing loads. */
  EN_13906(
      "factor q",
      Citation.remembered(Source.EN_13906_3, "stress correction factor, changing loads only")) {
    @Override
    double factor(double c) {
      return (c + 0.07) / (c - 0.75);
    }
  };

  private final String words;
  private final Citation citation;

  BendingFactor(String words, Citation citation) {
    this.words = words;
    this.citation = citation;
  }

  abstract double factor(double c);

  /**
   * The factor.
   *
   * @param springIndex C = D/d [-], above 1
   * @return K [-]
   * @throws IllegalArgumentException if the index is not above 1 and finite
   */
  public double at(double springIndex) {
    return factor(Require.above(springIndex, 1, "spring index", "-"));
  }

  /** The factor in words. */
  public String words() {
    return words;
  }

  /** Where the factor is published. */
  public Citation citation() {
    return citation;
  }
}
