package coilwright.problem;

import coilwright.material.ModulusLaw;
import coilwright.unit.Dimension;
import java.util.List;

/**
 * The keys of one modulus of an own grade.
 *
 * @param whole the modulus itself: a constant or a table
 * @param upTo the greatest diameter of a step
 * @param step the modulus of a step
 */
record ModulusKeys(
    ProblemKey<LawGiven<ModulusLaw>> whole, ProblemKey<Double> upTo, ProblemKey<Double> step) {

  /**
   * The keys of a modulus.
   *
   * @param path the path of the modulus
   * @param range what any spring wire has [MPa]
   * @param example a constant
   * @param stepExample the modulus of a step
   * @return the keys
   */
  static ModulusKeys of(String path, Range range, String example, String stepExample) {
    ProblemKey<Double> upTo =
        ProblemKey.of(
            path + "[].up_to",
            Values.length(),
            "",
            "greatest wire diameter of the step, itself included",
            "1 mm");
    ProblemKey<Double> step =
        ProblemKey.of(
            path + "[].modulus",
            Values.ofWire(Dimension.STRESS, range),
            "",
            "modulus up to there",
            stepExample);
    return new ModulusKeys(
        ProblemKey.of(
            path,
            new ModulusReader(new StepsReader(path + "[]", upTo, step)),
            MaterialKeys.OF_LIKE,
            "a constant or a table of steps",
            example,
            "[{up_to: 1 mm, modulus: "
                + stepExample
                + "}, {up_to: 6 mm, modulus: "
                + example
                + "}]"),
        upTo,
        step);
  }

  /** All of them. */
  List<ProblemKey<?>> rows() {
    return List.of(whole, upTo, step);
  }
}
