package coilwright.spring;

import coilwright.source.Citation;
import coilwright.source.Source;
import coilwright.unit.Dimension;
import coilwright.unit.Require;

/**
 * The initial tension that close-wound coils usually come to, as two textbooks give it: a range of
 * uncorrected torsion stress for each spring index. Both are published for indices of about 4 to 16
 * and are used beyond; never below zero.
 */
public enum InitialTension {
  /** 33500/exp(0.105 C) psi, give or take 1000 (4 - (C - 3)/6.5) psi. */
  SHIGLEY("Shigley", Citation.remembered(Source.SHIGLEY, "equation 10-41")) {
    @Override
    double low(double c) {
      return line(c) - width(c);
    }

    @Override
    double high(double c) {
      return line(c) + width(c);
    }

    @Override
    double slope(double c, boolean least) {
      double narrows = width(c) > 0 ? -PER_INDEX : 0;
      return -DECAY * line(c) + (least ? -narrows : narrows);
    }

    private double line(double c) {
      return 33_500 * StrictMath.exp(-DECAY * c);
    }

    private double width(double c) {
      return Math.max(0, 4000 - PER_INDEX * (c - 3));
    }
  },
  /** Two cubics of the index. */
  NORTON("Norton", Citation.remembered(Source.NORTON, "equations of the preferred range")) {
    @Override
    double low(double c) {
      return ((-4.231 * c + 181.5) * c - 3387) * c + 28_640;
    }

    @Override
    double high(double c) {
      return ((-2.987 * c + 139.7) * c - 3427) * c + 38_404;
    }

    @Override
    double slope(double c, boolean least) {
      return least
          ? (3 * -4.231 * c + 2 * 181.5) * c - 3387
          : (3 * -2.987 * c + 2 * 139.7) * c - 3427;
    }
  };

  /** The one that decides: its range stays above zero to an index of about 28. */
  public static final InitialTension USUAL = SHIGLEY;

  /** What the first relation falls by for each unit of the index. */
  private static final double DECAY = 0.105;

  /** What its range narrows by on either side, likewise [psi]. */
  private static final double PER_INDEX = 1000 / 6.5;

  private static final double MPA_PER_PSI = Dimension.STRESS.unit("psi").orElseThrow().toInner(1);

  private final String author;
  private final Citation citation;

  InitialTension(String author, Citation citation) {
    this.author = author;
    this.citation = citation;
  }

  /** The lower line [psi]. */
  abstract double low(double c);

  /** The upper line [psi]. */
  abstract double high(double c);

  /** What either line rises by for each unit of the index [psi]. */
  abstract double slope(double c, boolean least);

  /** Whose relation it is. */
  public String author() {
    return author;
  }

  /** Where it is published. */
  public Citation citation() {
    return citation;
  }

  /**
   * The least of the preferred range.
   *
   * @param springIndex C [-]
   * @return uncorrected stress [MPa], zero or more
   * @throws IllegalArgumentException if the index is not positive and finite
   */
  public double least(double springIndex) {
    return Math.max(0, low(Require.positive(springIndex, "spring index", "-"))) * MPA_PER_PSI;
  }

  /**
   * The greatest of the preferred range.
   *
   * @param springIndex C [-]
   * @return uncorrected stress [MPa], zero or more
   * @throws IllegalArgumentException if the index is not positive and finite
   */
  public double greatest(double springIndex) {
    return Math.max(0, high(Require.positive(springIndex, "spring index", "-"))) * MPA_PER_PSI;
  }

  /**
   * How an end of the preferred range changes with the index.
   *
   * @param springIndex C [-]
   * @param least whether the least is meant, else the greatest
   * @return d tau/d C [MPa], where the end is not held at zero
   */
  public double slopeAt(double springIndex, boolean least) {
    return slope(springIndex, least) * MPA_PER_PSI;
  }

  /**
   * The middle of the preferred range.
   *
   * @param springIndex C [-]
   * @return uncorrected stress [MPa]
   * @throws IllegalArgumentException if the index is not positive and finite
   */
  public double middle(double springIndex) {
    return (least(springIndex) + greatest(springIndex)) / 2;
  }

  /**
   * The force that an uncorrected stress stands for, F0 = pi d^3 tau/(8 D).
   *
   * @param stress tau [MPa]
   * @param meanDiameter D [mm]
   * @param wireDiameter d [mm]
   * @return F0 [N]
   * @throws IllegalArgumentException if a diameter is not positive and finite
   */
  public static double force(double stress, double meanDiameter, double wireDiameter) {
    return stress / ShearStress.uncorrected(1, meanDiameter, wireDiameter);
  }
}
