package coilwright.report;

import coilwright.material.WireGrade;
import coilwright.problem.Band;
import coilwright.problem.StressLimit;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.function.ToDoubleFunction;

/**
 * Limits that several kinds of spring have, in words.
 *
 * @param words where rows are added
 */
record LimitWords(Understood words) {

  /** Adds the least surge frequency where one is asked. */
  void surge() {
    words
        .problem()
        .limits()
        .minSurgeFrequency()
        .ifPresent(least -> words.row("surge", "from " + Numbers.brief(least, 1) + " Hz"));
  }

  /** "5 to 12". */
  static String band(Band band) {
    if (band.min().isEmpty() && band.max().isEmpty()) {
      return "any";
    }
    String min = band.min().isPresent() ? Numbers.brief(band.min().getAsDouble(), 4) : "";
    String max = band.max().isPresent() ? Numbers.brief(band.max().getAsDouble(), 4) : "";
    if (max.isEmpty()) {
      return "from " + min;
    }
    return min.isEmpty() ? "up to " + max : min + " to " + max;
  }

  /**
   * The share of each grade, grades with the same one together.
   *
   * @param limit what the file says
   * @param choice the share of a grade [-]
   */
  String share(StressLimit limit, ToDoubleFunction<WireGrade> choice) {
    if (!limit.judged()) {
      return "not judged";
    }
    if (limit.share().isPresent()) {
      return percent(limit.share().getAsDouble()) + " of tensile strength";
    }
    if (words.grades().isEmpty()) {
      return "the share of tensile strength that the basis gives";
    }
    Map<Double, List<String>> byShare = new LinkedHashMap<>();
    for (WireGrade grade : words.grades()) {
      byShare
          .computeIfAbsent(choice.applyAsDouble(grade), share -> new ArrayList<>())
          .add(grade.id());
    }
    List<String> parts = new ArrayList<>();
    byShare.forEach(
        (share, ids) ->
            parts.add(
                percent(share) + (byShare.size() > 1 ? " (" + String.join(", ", ids) + ")" : "")));
    return String.join(", ", parts) + " of tensile strength";
  }

  /** A share in percent. */
  static String percent(double share) {
    return Numbers.brief(100 * share, 3) + " %";
  }
}
