package coilwright.report;

import coilwright.problem.BucklingRule;
import coilwright.problem.Design;
import coilwright.problem.Problem;
import coilwright.problem.Requirement;
import coilwright.search.CompressionSearch;
import coilwright.search.Synthesis;
import coilwright.source.Evidence;
import coilwright.spring.CompressionState;
import coilwright.spring.EndType;
import coilwright.spring.LoadState;
import coilwright.spring.Method;
import coilwright.unit.Dimension;
import java.io.IOException;
import java.util.List;

/** Compression springs in text, JSON and CSV. */
final class CompressionSheet implements Sheet<CompressionState> {

  private static final List<Column<CompressionState>> COLUMNS =
      List.of(
          column("n", "active_coils"),
          column("nt", "total_coils"),
          column("D", "mean_diameter"),
          column("De", "outside_diameter"),
          column("L0", "free_length"),
          column("Ls", "solid_length"),
          column("index", "spring_index"),
          column("mass", "mass"),
          column("cost", "cost_index"));

  private static final int AFTER_FREE_LENGTH = 5;

  private static Column<CompressionState> column(String head, String stem) {
    return new Column<>(head, Quantities.in(CompressionQuantities.SPRING, stem));
  }

  @Override
  public Synthesis<CompressionState> synthesis() {
    return new CompressionSearch();
  }

  @Override
  public String title() {
    return "Compression spring";
  }

  @Override
  public String ends(String endForm) {
    return endForm + " ends";
  }

  @Override
  public List<SpringPart<CompressionState>> parts(Problem problem) {
    return CompressionFields.parts(problem);
  }

  @Override
  public List<Field<Design>> design() {
    return CompressionFields.DESIGN;
  }

  @Override
  public void addSpring(TextTable table, CompressionState spring, OutputUnits units) {
    CompressionQuantities.SPRING.forEach(one -> one.addTo(table, spring, units));
    CompressionQuantities.OUTSIDE_DIAMETER_AT_SOLID.addTo(table, spring, units);
    Quantity<CompressionState> critical = CompressionQuantities.CRITICAL_DEFLECTION;
    if (Double.isInfinite(spring.criticalDeflection())) {
      table.row(critical.label(), "none", "cannot buckle");
    } else {
      critical.addTo(table, spring, units);
    }
  }

  @Override
  public TextTable loads(CompressionState spring, OutputUnits units) {
    LoadTable<LoadState> table = new LoadTable<>(CompressionQuantities.LOAD, units);
    table.addAll(spring.loads());
    spring.overtravel().ifPresent(load -> table.add("overtravel", load));
    return table.add("solid", spring.solid()).table();
  }

  @Override
  public List<Column<CompressionState>> columns(Problem problem) {
    return lengthsFound(problem)
        ? FoundLengths.among(
            COLUMNS,
            AFTER_FREE_LENGTH,
            problem.facts().loads().size(),
            (state, load) -> state.loads().get(load).length())
        : COLUMNS;
  }

  /** Whether the loaded lengths are part of the answer. */
  private static boolean lengthsFound(Problem problem) {
    return problem.required().orElseThrow().freeLength().isEmpty();
  }

  @Override
  public String legend() {
    return "n active and nt total coils, D mean and De outside diameter, L0 free and Ls solid length;";
  }

  @Override
  public String remark(Problem problem) {
    return lengthsFound(problem) ? FoundLengths.REMARK : "";
  }

  @Override
  public List<Note<CompressionState>> notes(Problem problem) {
    return List.of(
        new Note<>(
            "diameter tolerance not seen for the grade but taken for it, on which the solid length rests",
            state -> takenTolerance(problem, state)),
        new Note<>(
            "would buckle without the bore or rod that guides it, and rubs there",
            state -> buckles(problem, state)),
        new Note<>(LoadWords.OVERTRAVEL_WITHIN, CompressionSheet::overtravelWithinLoads));
  }

  /**
   * The solid length by EN 13906-1 is that of the greatest wire; the handbook takes the nominal.
   */
  private static boolean takenTolerance(Problem problem, CompressionState state) {
    return problem.limits().method() == Method.EN_13906
        && state.wire().diameterToleranceEvidence() == Evidence.MEMORY;
  }

  private static boolean buckles(Problem problem, CompressionState state) {
    return problem.limits().buckling() == BucklingRule.AT_LOAD_UNLESS_GUIDED
        && problem.envelope().guides()
        && !state.stableAt(state.extreme());
  }

  /** Where lengths are found, only the spring tells which of its lengths is the shortest. */
  private static boolean overtravelWithinLoads(CompressionState state) {
    return state.overtravel().isPresent()
        && !(state.overtravel().get().length() < state.mostCompressed().length());
  }

  @Override
  public void understandLoads(Understood words) {
    Problem problem = words.problem();
    words.row("loads", new LoadWords(words).text());
    problem.required().ifPresent(required -> words.row(words.each(), line(words, required)));
    new LoadWords(words).overtravel();
  }

  private static String line(Understood words, Requirement required) {
    return "rate "
        + words.units().brief(Dimension.RATE, required.rate(), 4)
        + ", "
        + (required.freeLength().isPresent()
            ? "free length " + words.length(required.freeLength().getAsDouble())
            : "lengths as short as the limits allow")
        + ", from "
        + required.rule();
  }

  @Override
  public void understandEnds(Understood words) {
    List<EndType> ends = words.problem().make().ends();
    words.row("ends", String.join(", ", ends.stream().map(EndType::id).toList()));
  }

  @Override
  public boolean roundsLength(Problem problem) {
    return true;
  }

  @Override
  public void understandLimits(Understood words) {
    new CompressionLimitWords(words).add();
  }

  @Override
  public void writeRequired(Json json, Problem problem) throws IOException {
    CompressionProblemJson.required(json, problem);
  }

  @Override
  public void writeLoads(Json json, Problem problem) throws IOException {
    ProblemValues.loads(json, problem);
  }

  @Override
  public void writeHolding(Json json, Problem problem) throws IOException {
    if (problem.seats().isPresent()) {
      json.string("seats", problem.seats().get().id());
    }
  }

  @Override
  public void writeEnds(Json json, Problem problem) throws IOException {
    json.strings("ends", problem.make().ends().stream().map(EndType::id).toList());
  }

  @Override
  public void writeSetRemoved(Json json, boolean setRemoved) throws IOException {
    json.flag("set_removed", setRemoved);
  }

  @Override
  public void writeDesign(Json json, Design design) throws IOException {
    CompressionProblemJson.design(json, design);
  }

  @Override
  public void writeLimits(Json json, Problem problem) throws IOException {
    CompressionProblemJson.limits(json, problem.limits());
  }
}
