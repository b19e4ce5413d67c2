package coilwright.report;

import coilwright.material.WireSeries;
import coilwright.material.WireSize;
import coilwright.problem.Band;
import coilwright.problem.BucklingRule;
import coilwright.problem.DesignLimits;
import coilwright.problem.Envelope;
import coilwright.problem.Make;
import coilwright.problem.Problem;
import coilwright.problem.Requirement;
import coilwright.problem.StressLimit;
import coilwright.spring.EndType;
import coilwright.spring.LoadPoint;
import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;

/** The problem in words, so that a reader sees at once what was understood and what was assumed. */
final class Understood {

  private final Problem problem;
  private final TextTable table = new TextTable("ll");

  private Understood(Problem problem) {
    this.problem = problem;
  }

  /** The loads, the space and the limits of any problem. */
  static String of(Problem problem, List<String> materials) {
    Understood words = new Understood(problem);
    words.loads();
    words.space(problem.envelope());
    if (problem.design().isEmpty()) {
      words.make(problem.make(), materials);
    }
    words.seats();
    words.limits(problem.limits());
    return words.table.text("  ");
  }

  private void loads() {
    int parallel = problem.facts().springsInParallel();
    String each = parallel > 1 ? ", each of " + parallel + " side by side" : "";
    if (problem.required().isEmpty()) {
      table.row("loads", "as the spring gives them; the file does not fix the load line" + each);
      return;
    }
    Requirement required = problem.required().get();
    List<String> points = new ArrayList<>();
    for (LoadPoint load : required.loads()) {
      points.add(
          Numbers.brief(load.force().orElse(Double.NaN), 3)
              + " N at "
              + Numbers.brief(load.length().orElse(Double.NaN), 3)
              + " mm");
    }
    table.row("loads", String.join(", ", points) + each);
    table.row(
        "load line",
        "rate "
            + Numbers.brief(required.line().rate(), 4)
            + " N/mm, free length "
            + Numbers.brief(required.line().freeLength(), 3)
            + " mm, from "
            + required.rule());
  }

  private void space(Envelope space) {
    List<String> words = new ArrayList<>();
    length(words, "bore", space.bore());
    length(words, "rod", space.rod());
    if (space.guides()) {
      length(words, "diametral clearance", space.diametralClearance());
    }
    length(words, "outside diameter up to", space.maxOutsideDiameter());
    length(words, "inside diameter from", space.minInsideDiameter());
    length(words, "free length up to", space.maxFreeLength());
    length(words, "solid length up to", space.maxSolidLength());
    table.row("space", words.isEmpty() ? "no bound given" : String.join(", ", words));
  }

  private static void length(List<String> words, String name, OptionalDouble value) {
    if (value.isPresent()) {
      words.add(name + " " + Numbers.brief(value.getAsDouble(), 3) + " mm");
    }
  }

  private void make(Make make, List<String> materials) {
    boolean assumed = make.materials().isEmpty() && !make.allMaterials();
    table.row(
        "materials",
        (materials.isEmpty() ? "none in range" : String.join(", ", materials))
            + (assumed
                ? " (assumed: the common grades, supply " + make.supply().word() + ")"
                : ""));
    table.row("wire", wire(make));
    table.row("ends", String.join(", ", make.ends().stream().map(EndType::id).toList()));
    table.row(
        "steps",
        "coils "
            + Numbers.brief(make.coilStep(), 6)
            + ", mean diameter "
            + step(make.rounding().diameterStep(), make.rounding().smallDiameterStep())
            + ", free length "
            + step(make.rounding().lengthStep(), make.rounding().smallLengthStep()));
  }

  private static String wire(Make make) {
    if (!make.wireSizes().isEmpty()) {
      return String.join(", ", make.wireSizes().stream().map(WireSize::label).toList());
    }
    return make.wireSeries().isEmpty()
        ? "the usual series of each grade (assumed)"
        : String.join(", ", make.wireSeries().stream().map(WireSeries::id).toList());
  }

  private static String step(double step, double small) {
    return step == small
        ? Numbers.brief(step, 6) + " mm"
        : Numbers.brief(step, 6) + " mm (below 5 mm mean diameter " + Numbers.brief(small, 6) + ")";
  }

  private void seats() {
    table.row(
        "seats",
        problem
            .seats()
            .map(seating -> seating.id())
            .orElse("fixed-fixed for squared-ground ends, else pinned-pinned (assumed)"));
  }

  private void limits(DesignLimits limits) {
    List<String> words = new ArrayList<>();
    words.add("index " + band(limits.springIndex()));
    words.add("active coils " + band(limits.activeCoils()));
    words.add(
        limits.maxPitchAngle().isPresent()
            ? "pitch angle up to "
                + Numbers.brief(StrictMath.toDegrees(limits.maxPitchAngle().getAsDouble()), 2)
                + " deg"
            : "pitch angle any");
    words.add(
        limits.clashAllowance().isPresent()
            ? "clash allowance "
                + Numbers.brief(100 * limits.clashAllowance().getAsDouble(), 2)
                + " %"
            : "clash allowance none");
    table.row("limits", String.join(", ", words));
    table.row("stress", stress(limits));
    table.row("buckling", buckling(limits.buckling()));
    if (limits.minSurgeFrequency().isPresent()) {
      table.row(
          "surge", "from " + Numbers.brief(limits.minSurgeFrequency().getAsDouble(), 1) + " Hz");
    }
  }

  private static String band(Band band) {
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

  private static String stress(DesignLimits limits) {
    String load = share(limits.stressAtLoad());
    String solid = share(limits.stressAtSolid());
    String shares =
        load.equals(solid)
            ? "at load and at solid " + load
            : "at load " + load + ", at solid " + solid;
    return shares + ", corrected by " + limits.stressCorrection().author();
  }

  private static String share(StressLimit limit) {
    if (!limit.judged()) {
      return "not judged";
    }
    return limit.share().isPresent()
        ? Numbers.brief(100 * limit.share().getAsDouble(), 3) + " % of tensile strength"
        : "the handbook's share of tensile strength";
  }

  private String buckling(BucklingRule rule) {
    return switch (rule) {
      case AT_LOAD -> "judged at the most compressed load";
      case AT_SOLID -> "judged at solid";
      case NONE -> "not judged";
      case AT_LOAD_UNLESS_GUIDED ->
          problem.envelope().guides()
              ? "reported, not judged: a bore or rod guides the spring (assumed)"
              : "judged at the most compressed load (assumed)";
    };
  }

  /** The title, cleared of control characters; a plain one where the file has none. */
  static String title(Problem problem) {
    String title = problem.title().replaceAll("\\p{Cc}", " ").strip();
    return title.isEmpty() ? "Compression spring" : title;
  }
}
