package coilwright.report;

import coilwright.problem.Design;
import coilwright.problem.ExtensionAsked;
import coilwright.problem.HookLength;
import coilwright.problem.LoopPlanes;
import coilwright.problem.Problem;
import coilwright.search.ExtensionSearch;
import coilwright.search.Synthesis;
import coilwright.spring.ExtensionLoad;
import coilwright.spring.ExtensionState;
import coilwright.spring.HookStress;
import java.io.IOException;
import java.util.List;

/** Extension springs in text, JSON and CSV. */
final class ExtensionSheet implements Sheet<ExtensionState> {

  private static final List<Column<ExtensionState>> COLUMNS =
      List.of(
          column("nb", "body_coils"),
          column("D", "mean_diameter"),
          column("De", "outside_diameter"),
          column("L0", "free_length"),
          column("hook", "hook_length"),
          column("F0", "initial_tension"),
          column("index", "spring_index"),
          column("mass", "mass"),
          column("cost", "cost_index"));

  private static final int AFTER_FREE_LENGTH = 4;

  private static Column<ExtensionState> column(String head, String stem) {
    return new Column<>(head, Quantities.in(ExtensionQuantities.SPRING, stem));
  }

  @Override
  public Synthesis<ExtensionState> synthesis() {
    return new ExtensionSearch();
  }

  @Override
  public String title() {
    return "Extension spring";
  }

  @Override
  public String ends(String endForm) {
    return endForm.endsWith("hook") ? endForm + "s" : endForm + " hooks";
  }

  @Override
  public List<SpringPart<ExtensionState>> parts(Problem problem) {
    return ExtensionFields.parts(problem);
  }

  @Override
  public List<Field<Design>> design() {
    return ExtensionFields.DESIGN;
  }

  @Override
  public void addSpring(TextTable table, ExtensionState spring, OutputUnits units) {
    for (Quantity<ExtensionState> one : ExtensionQuantities.SPRING) {
      one.addTo(table, spring, units);
      if (one.stem().equals("initial_tension_stress")) {
        ExtensionQuantities.PREFERRED.forEach(end -> end.addTo(table, spring, units));
        ExtensionQuantities.ALSO_PREFERRED.forEach(end -> end.addTo(table, spring, units));
      }
    }
  }

  @Override
  public TextTable loads(ExtensionState spring, OutputUnits units) {
    LoadTable<ExtensionLoad> table = new LoadTable<>(ExtensionQuantities.LOAD, units);
    table.addAll(spring.loads());
    spring.overtravel().ifPresent(load -> table.add("overtravel", load));
    return table.table();
  }

  @Override
  public List<Column<ExtensionState>> columns(Problem problem) {
    return lengthsFound(problem)
        ? FoundLengths.among(
            COLUMNS,
            AFTER_FREE_LENGTH,
            problem.facts().loads().size(),
            (state, load) -> state.loads().get(load).length())
        : COLUMNS;
  }

  private static boolean lengthsFound(Problem problem) {
    return asked(problem).line().orElseThrow().zeroForceLength().isEmpty();
  }

  @Override
  public String legend() {
    return "nb body coils, D mean and De outside diameter, L0 free length inside the hooks, hook how far each\n"
        + "  reaches beyond the body to its inside, F0 initial tension;";
  }

  @Override
  public String remark(Problem problem) {
    return lengthsFound(problem) ? FoundLengths.REMARK : "";
  }

  @Override
  public List<Note<ExtensionState>> notes(Problem problem) {
    return List.of(
        new Note<>(
            "side loops: load beside the axis, so that rate holds only roughly and no stress is assessed;"
                + " they stand behind all springs held to stress; verify by test",
            state -> !state.stressAssessed()),
        new Note<>(
            "index of the side bend C2 below 4: bend the hook with a larger radius if it can be",
            state -> state.spring().sideIndex() < HookStress.LEAST_SIDE_INDEX),
        new Note<>(LoadWords.OVERTRAVEL_WITHIN, ExtensionSheet::overtravelWithinLoads));
  }

  /** Where lengths are found, only the spring tells which of its lengths is the longest. */
  private static boolean overtravelWithinLoads(ExtensionState state) {
    return state.overtravel().isPresent()
        && !(state.overtravel().get().length() > state.extendedLength());
  }

  @Override
  public void understandLoads(Understood words) {
    new ExtensionWords(words).loads();
  }

  @Override
  public void understandSpace(Understood words, List<String> space) {
    ExtensionAsked asked = asked(words.problem());
    words.bound(space, "extended length up to", asked.maxExtendedLength());
    words.bound(space, "pin through the hooks", asked.pin());
  }

  @Override
  public void understandEnds(Understood words) {
    new ExtensionWords(words).hooks();
  }

  /** {@inheritDoc} Hooks at a right angle fix a quarter of a coil or three. */
  @Override
  public boolean stepsCoils(Problem problem) {
    return asked(problem).hooks().planes() != LoopPlanes.RIGHT_ANGLE;
  }

  @Override
  public boolean roundsLength(Problem problem) {
    return asked(problem).hooks().length().rule() == HookLength.Rule.FREE;
  }

  @Override
  public void understandLimits(Understood words) {
    new ExtensionWords(words).limits();
  }

  @Override
  public void writeRequired(Json json, Problem problem) throws IOException {
    ExtensionProblemJson.required(json, asked(problem));
  }

  @Override
  public void writeLoads(Json json, Problem problem) throws IOException {
    ProblemValues.loads(json, problem);
  }

  @Override
  public void writeSpace(Json json, Problem problem) throws IOException {
    ProblemValues.optional(json, "max_extended_length_mm", asked(problem).maxExtendedLength());
    ProblemValues.optional(json, "pin_mm", asked(problem).pin());
  }

  @Override
  public void writeEnds(Json json, Problem problem) throws IOException {
    ExtensionProblemJson.hooks(json, asked(problem).hooks());
  }

  @Override
  public void writeDesign(Json json, Design design) throws IOException {
    ExtensionProblemJson.design(json, design);
  }

  @Override
  public void writeLimits(Json json, Problem problem) throws IOException {
    ExtensionProblemJson.limits(json, problem);
  }

  private static ExtensionAsked asked(Problem problem) {
    return problem.extension().orElseThrow();
  }
}
