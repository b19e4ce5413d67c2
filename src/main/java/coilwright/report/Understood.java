package coilwright.report;

import coilwright.material.WireGrade;
import coilwright.material.WireSeries;
import coilwright.material.WireSize;
import coilwright.problem.CompressionDesign;
import coilwright.problem.Envelope;
import coilwright.problem.LoadAsked;
import coilwright.problem.Make;
import coilwright.problem.Problem;
import coilwright.problem.Requirement;
import coilwright.problem.Tolerance;
import coilwright.spring.EndType;
import coilwright.spring.Rounding;
import coilwright.spring.Seating;
import coilwright.unit.Dimension;
import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;

/** The problem in words, so that a reader sees at once what was understood and what was assumed. */
final class Understood {

  private final Problem problem;
  private final List<WireGrade> grades;
  private final OutputUnits units;
  private final TextTable table = new TextTable("ll");

  private Understood(Problem problem, List<WireGrade> grades, OutputUnits units) {
    this.problem = problem;
    this.grades = grades;
    this.units = units;
  }

  /**
   * The loads, the space, what may be made, and the limits.
   *
   * @param problem the problem
   * @param grades the grades tried, or the one checked
   * @param units the units shown
   */
  static String of(Problem problem, List<WireGrade> grades, OutputUnits units) {
    Understood words = new Understood(problem, grades, units);
    words.loads();
    words.space(problem.envelope());
    if (problem.design().isEmpty()) {
      words.make(problem.make());
    }
    words.treatment();
    if (problem.design().isEmpty()) {
      words.steps(problem.make());
    }
    words.seats();
    new UnderstoodLimits(problem, grades).addTo(words.table);
    return words.table.text("  ");
  }

  private void loads() {
    int parallel = problem.facts().springsInParallel();
    String stroke =
        problem.facts().stroke().isPresent()
            ? "; stroke " + length(problem.facts().stroke().getAsDouble())
            : "";
    String shared = parallel > 1 ? ", shared by " + parallel + " springs side by side" : "";
    List<String> loads = problem.facts().loads().stream().map(this::load).toList();
    table.row("loads", String.join("; ", loads) + stroke + shared);
    if (problem.required().isPresent()) {
      Requirement required = problem.required().get();
      table.row(
          parallel > 1 ? "each spring" : "load line",
          "rate "
              + units.brief(Dimension.RATE, required.rate(), 4)
              + ", "
              + (required.freeLength().isPresent()
                  ? "free length " + length(required.freeLength().getAsDouble())
                  : "lengths as short as the limits allow")
              + ", from "
              + required.rule());
    }
    problem
        .overtravel()
        .ifPresent(length -> table.row("overtravel", "to " + length(length) + ", no force asked"));
  }

  private String load(LoadAsked load) {
    List<String> words = new ArrayList<>();
    load.force().ifPresent(force -> words.add(units.brief(Dimension.FORCE, force, 3)));
    load.tolerance().map(this::tolerance).ifPresent(words::add);
    load.length().ifPresent(length -> words.add("at " + length(length)));
    if (load.force().isEmpty()) {
      words.add("(force found)");
    }
    if (load.length().isEmpty()) {
      words.add("(length found)");
    }
    return String.join(" ", words);
  }

  private String tolerance(Tolerance tolerance) {
    return "(+"
        + units.number(Dimension.FORCE, tolerance.plus(), 3)
        + " -"
        + units.brief(Dimension.FORCE, tolerance.minus(), 3)
        + " accepted, not judged)";
  }

  /** With a digit more in inches, so that an inch file's lengths come back as they were typed. */
  private String length(double value) {
    return units.brief(Dimension.LENGTH, value, units == OutputUnits.METRIC ? 3 : 4);
  }

  private void space(Envelope space) {
    List<String> words = new ArrayList<>();
    bound(words, "bore", space.bore());
    bound(words, "rod", space.rod());
    if (space.guides()) {
      bound(words, "diametral clearance", space.diametralClearance());
    }
    if (space.clearanceAssumed()) {
      words.add("clearance the coil diameter tolerance of EN 15800 grade 2 (assumed)");
    }
    bound(words, "outside diameter up to", space.maxOutsideDiameter());
    bound(words, "inside diameter from", space.minInsideDiameter());
    bound(words, "free length up to", space.maxFreeLength());
    bound(words, "solid length up to", space.maxSolidLength());
    table.row("space", words.isEmpty() ? "no bound given" : String.join(", ", words));
  }

  private void bound(List<String> words, String name, OptionalDouble value) {
    value.ifPresent(given -> words.add(name + " " + length(given)));
  }

  private void make(Make make) {
    boolean assumed = make.materials().isEmpty() && !make.allMaterials();
    List<String> ids = grades.stream().map(WireGrade::id).toList();
    table.row(
        "materials",
        (ids.isEmpty() ? "none in range" : String.join(", ", ids))
            + (assumed ? " (assumed: common grades, supply " + make.supply().word() + ")" : ""));
    table.row("wire", wire(make));
    table.row("ends", String.join(", ", make.ends().stream().map(EndType::id).toList()));
  }

  /** What is done to the spring, of a list and of a checked spring alike. */
  private void treatment() {
    if (problem.setRemoved()) {
      table.row("set", "removed: pressed solid once before use");
    }
    if (problem.coating() > 0) {
      table.row("coating", units.brief(Dimension.LENGTH, problem.coating(), 4) + " thick");
    }
  }

  private void steps(Make make) {
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

  private String step(double step, double small) {
    if (step == 0 && small == 0) {
      return "not rounded";
    }
    String shown = units.brief(Dimension.LENGTH, step, 6);
    return step == small
        ? shown
        : shown + " (a tenth below " + length(Rounding.SMALL_BELOW) + " mean diameter)";
  }

  private void seats() {
    table.row("seats", problem.seats().map(Seating::id).orElseGet(this::assumedSeats));
  }

  private String assumedSeats() {
    return problem
        .design()
        .map(CompressionDesign.class::cast)
        .map(CompressionDesign::ends)
        .map(ends -> Seating.usualFor(ends).id() + " (assumed)")
        .orElse("fixed-fixed for squared-ground ends, else pinned-pinned (assumed)");
  }

  /** The title, cleared of control characters; a plain one where the file has none. */
  static String title(Problem problem) {
    String title = problem.title().replaceAll("\\p{Cc}", " ").strip();
    return title.isEmpty() ? "Compression spring" : title;
  }
}
