package coilwright.spring;

/** How far rounding may move the numbers of an extension family's springs. */
final class ExtensionRounding {

  private static final double SAFETY = 1.25;
  private static final double LEAST_SLOPE = 0.02;

  /** The most of a count that a difference which hardly changes along the family is given [-]. */
  private static final double MOST = 0.15;

  /** A step of the mean diameter for slopes, as a share. */
  private static final double NEXT = 1e-4;

  private final ExtensionFamily family;
  private final ExtensionCurve curve;

  ExtensionRounding(ExtensionFamily family) {
    this.family = family;
    this.curve = family.curve();
  }

  /**
   * The share by which a force, a stress, or a small difference of such may move, of the greatest
   * force. Half a step of the diameter moves the rate by 3 dD/D and natural hooks by 2 dD.
   */
  double share(double coils) {
    double mean = curve.meanDiameterAt(coils);
    return 2 * rated(mean) + curve.rate() * moved(mean) / force();
  }

  /** 3 dD/D. */
  private double rated(double mean) {
    return 3 * family.rounding().diameterStepAt(mean) / 2 / mean;
  }

  /** By how much rounding may move the free length [mm]. */
  private double moved(double mean) {
    return family.rounding().diameterStepAt(mean) + family.rounding().lengthStepAt(mean) / 2;
  }

  /** The greatest force asked [N]. */
  private double force() {
    double greatest = 0;
    for (LoadPoint load : family.duty().loads()) {
      greatest = Math.max(greatest, load.force().orElse(0));
    }
    return greatest;
  }

  /**
   * Coils by which an unrounded spring may differ from a rounded one and still be judged alike.
   * Along the family a stress goes with K D: a share of it is that share over the slope of K D, in
   * coils. A length or an initial tension is the movement over its slope.
   */
  double play(double coils) {
    double mean = curve.meanDiameterAt(coils);
    double active = coils + curve.hooks().bothActive();
    double stress = active * 2 * rated(mean) / stressSlope(mean);
    double length = moved(mean) + force() / curve.rate() * rated(mean);
    double fitting = length > 0 ? length / leastSlope(coils, mean) : 0;
    return SAFETY * (stress + Math.min(MOST * active + 1, fitting));
  }

  /** d ln(K D) / d ln D with the factor (4C + 2)/(4C - 3), kept away from zero. */
  private double stressSlope(double mean) {
    double c = mean / curve.wire().diameter();
    return Math.max(LEAST_SLOPE, Math.abs(1 + 4 * c / (4 * c + 2) - 4 * c / (4 * c - 3)));
  }

  /**
   * The least slope of what is judged as a length or an initial tension [mm per coil]: of the free
   * length, of the initial tension beyond either end of its preferred range, and of what the hooks
   * reach beyond the shortest that can be bent.
   */
  private double leastSlope(double coils, double mean) {
    double each = mean / (3 * (coils + curve.hooks().bothActive()));
    double wire = curve.coatedDiameter();
    if (curve.tensionChosen()) {
      double next = mean * (1 - NEXT);
      double free = curve.freeLengthAt(mean) - curve.freeLengthAt(next);
      double spare = spare(mean) - spare(next);
      return each / (mean * NEXT) * Math.min(Math.abs(free), Math.abs(spare));
    }
    double tension = curve.tensionSlopeAt(mean) / curve.rate();
    double least = Math.min(beyond(mean, tension, true), beyond(mean, tension, false));
    double shortest = curve.hooks().type().leastShare();
    return switch (curve.fit().rule()) {
      case HOOK_LENGTH -> Math.min(each * Math.min(least, shortest), wire);
      case FREE_LENGTH -> each * Math.min(least, Math.abs(wire / (2 * each) - shortest));
      default -> each * Math.min(least, Math.abs(tension));
    };
  }

  /** Slope of the initial tension beyond an end of its preferred range, as a length [mm per mm]. */
  private double beyond(double mean, double tension, boolean least) {
    double d = curve.wire().diameter();
    double c = mean / d;
    InitialTension usual = InitialTension.USUAL;
    double stress = least ? usual.least(c) : usual.greatest(c);
    double slope = usual.slopeAt(c, least) / d - stress / mean;
    return Math.abs(tension - InitialTension.force(slope, mean, d) / curve.rate());
  }

  /** What the hooks reach beyond the shortest that can be bent [mm]. */
  private double spare(double mean) {
    return curve.hookLengthAt(mean) - curve.hooks().leastLength(mean, curve.coatedDiameter());
  }
}
