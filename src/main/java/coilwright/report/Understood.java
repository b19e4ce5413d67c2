package coilwright.report;

import coilwright.material.WireGrade;
import coilwright.material.WireSeries;
import coilwright.material.WireSize;
import coilwright.problem.Envelope;
import coilwright.problem.Make;
import coilwright.problem.Problem;
import coilwright.search.CoilStep;
import coilwright.spring.Rounding;
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
   * @param sheet what is particular to the kind of spring
   * @param problem the problem
   * @param grades the grades tried, or the one checked
   * @param units the units shown
   */
  static String of(Sheet<?> sheet, Problem problem, List<WireGrade> grades, OutputUnits units) {
    Understood words = new Understood(problem, grades, units);
    sheet.understandLoads(words);
    words.space(sheet, problem.envelope());
    if (problem.design().isEmpty()) {
      words.make(problem.make());
      sheet.understandEnds(words);
    } else {
      sheet.understandDesign(words);
    }
    words.treatment();
    if (problem.design().isEmpty()) {
      words.steps(sheet);
    }
    sheet.understandLimits(words);
    return words.table.text("  ");
  }

  /** The problem. */
  Problem problem() {
    return problem;
  }

  /** The grades tried, or the one checked. */
  List<WireGrade> grades() {
    return grades;
  }

  /** The units shown. */
  OutputUnits units() {
    return units;
  }

  /** Adds a row. */
  void row(String name, String words) {
    table.row(name, words);
  }

  /** ", shared by 2 springs side by side"; empty for one. */
  String shared() {
    int parallel = problem.facts().springsInParallel();
    return parallel > 1 ? ", shared by " + parallel + " springs side by side" : "";
  }

  /** The name of the row of what one spring must do. */
  String each() {
    return problem.facts().springsInParallel() > 1 ? "each spring" : "load line";
  }

  /** With a digit more in inches, so that an inch file's lengths come back as they were typed. */
  String length(double value) {
    return units.brief(Dimension.LENGTH, value, units == OutputUnits.METRIC ? 3 : 4);
  }

  private void space(Sheet<?> sheet, Envelope space) {
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
    sheet.understandSpace(this, words);
    table.row("space", words.isEmpty() ? "no bound given" : String.join(", ", words));
  }

  /** Adds a bound where it is given. */
  void bound(List<String> words, String name, OptionalDouble value) {
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

  private void steps(Sheet<?> sheet) {
    Make make = problem.make();
    CoilStep step = sheet.synthesis().step(problem);
    table.row(
        "steps",
        "coils "
            + Numbers.brief(step.size(), 6)
            + (step.offset() > 0 ? " and " + Numbers.brief(step.offset(), 4) + " over" : "")
            + ", mean diameter "
            + step(make.rounding().diameterStep(), make.rounding().smallDiameterStep())
            + (sheet.roundsLength(problem)
                ? ", free length "
                    + step(make.rounding().lengthStep(), make.rounding().smallLengthStep())
                : ""));
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

  /** The title, cleared of control characters; a plain one where the file has none. */
  static String title(Sheet<?> sheet, Problem problem) {
    String title = problem.title().replaceAll("\\p{Cc}", " ").strip();
    return title.isEmpty() ? sheet.title() : title;
  }
}
