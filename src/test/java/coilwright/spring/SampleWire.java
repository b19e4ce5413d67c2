package coilwright.spring;

import coilwright.material.AllowableClass;
import coilwright.material.DiameterRange;
import coilwright.material.GradeSource;
import coilwright.material.ModulusLaw;
import coilwright.material.StrengthLaw;
import coilwright.material.Supply;
import coilwright.material.ToleranceLaw;
import coilwright.material.Wire;
import coilwright.material.WireGrade;
import coilwright.material.WireSize;
import coilwright.source.Evidence;
import java.util.List;
import java.util.OptionalDouble;

/** A made-up wire whose properties do not change with its diameter. */
public final class SampleWire {

  /** G [MPa]. */
  public static final double SHEAR_MODULUS = 81_500;

  /** E [MPa]. */
  public static final double ELASTIC_MODULUS = 206_000;

  /** Density [kg/m^3]. */
  public static final double DENSITY = 7850;

  /** Rm [MPa]. */
  public static final double STRENGTH = 1900;

  /** What the wire may differ from its diameter by. */
  public static final ToleranceLaw TOLERANCE = new Constant(0.02);

  private SampleWire() {}

  /** A wire of a diameter [mm]. */
  public static Wire of(double diameter) {
    return of(diameter, SHEAR_MODULUS);
  }

  /** A wire of a diameter [mm] with another shear modulus G [MPa]. */
  public static Wire of(double diameter, double shearModulus) {
    WireSize size = WireSize.explicit("sample", diameter);
    return new Wire(
        grade(AllowableClass.COLD_DRAWN_CARBON, OptionalDouble.empty(), OptionalDouble.empty()),
        size,
        STRENGTH,
        shearModulus,
        ELASTIC_MODULUS,
        Evidence.SEEN);
  }

  /** A grade of a class, with its own shares of strength at load and at solid where given. */
  public static WireGrade grade(
      AllowableClass allowableClass, OptionalDouble stressAtLoad, OptionalDouble stressAtSolid) {
    return new WireGrade(
        "sample",
        "Sample wire",
        "none",
        "drawn",
        Supply.ANY,
        false,
        allowableClass,
        new Constant(STRENGTH),
        new Constant(SHEAR_MODULUS),
        new Constant(ELASTIC_MODULUS),
        TOLERANCE,
        new DiameterRange(0, Double.POSITIVE_INFINITY),
        DENSITY,
        OptionalDouble.empty(),
        1,
        List.of(),
        stressAtLoad,
        stressAtSolid,
        List.<GradeSource>of());
  }

  /** A property that does not change with the diameter. */
  private record Constant(double value) implements StrengthLaw, ModulusLaw, ToleranceLaw {

    @Override
    public double at(double diameter) {
      return value;
    }

    @Override
    public Evidence evidenceAt(double diameter) {
      return Evidence.SEEN;
    }
  }
}
