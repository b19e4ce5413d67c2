package coilwright.problem;

import coilwright.spring.Kind;
import coilwright.unit.Dimension;
import java.util.List;

/**
 * The keys about the legs of a torsion spring, to be made or to be judged.
 *
 * @param legs their block
 * @param first length of the first
 * @param second length of the second
 * @param angle from the first to the second
 * @param atLoad the load at which the angle is wanted
 */
record LegKeys(
    ProblemKey<Section> legs,
    ProblemKey<Double> first,
    ProblemKey<Double> second,
    ProblemKey<Double> angle,
    ProblemKey<Integer> atLoad) {

  /** Of the spring to make. */
  static final LegKeys MAKE = of("make.legs", "reported, with a warning");

  /** Of the spring to judge. */
  static final LegKeys DESIGN = of("design.legs", "reported, not judged");

  private static LegKeys of(String path, String withoutAngle) {
    return new LegKeys(
        ProblemKey.of(
                path,
                new SectionReader(path),
                "no legs",
                "the straight legs",
                "{first: 20 mm, second: 20 mm, angle: 180 deg, at_load: 1}")
            .only(Kind.TORSION),
        length(path + ".first", "length of the first leg"),
        length(path + ".second", "length of the second leg"),
        ProblemKey.of(
                path + ".angle",
                Values.quantity(Dimension.ANGLE, Range.within(0, 2 * Math.PI)),
                withoutAngle,
                "from the first leg to the second, seen along the axis, in the winding direction",
                "180 deg")
            .only(Kind.TORSION),
        ProblemKey.of(
                path + ".at_load",
                Values.count(),
                "1",
                "the load at which the angle is wanted, the first being 1",
                "1")
            .only(Kind.TORSION));
  }

  private static ProblemKey<Double> length(String path, String help) {
    return ProblemKey.of(
            path, Values.quantity(Dimension.LENGTH, Range.FROM_ZERO), "0 mm", help, "20 mm")
        .only(Kind.TORSION);
  }

  /** All of them. */
  List<ProblemKey<?>> rows() {
    return List.of(legs, first, second, angle, atLoad);
  }
}
