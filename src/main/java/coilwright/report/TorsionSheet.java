package coilwright.report;

import coilwright.problem.Design;
import coilwright.problem.Problem;
import coilwright.problem.TorsionAsked;
import coilwright.problem.TorsionDesign;
import coilwright.search.Synthesis;
import coilwright.search.TorsionSearch;
import coilwright.spring.TorsionState;
import coilwright.unit.Dimension;
import java.io.IOException;
import java.util.List;

/** Torsion springs in text, JSON and CSV. */
final class TorsionSheet implements Sheet<TorsionState> {

  private static final List<Column<TorsionState>> COLUMNS =
      List.of(
          column("nb", "body_coils"),
          column("D", "mean_diameter"),
          column("De", "outside_diameter"),
          new Column<>(
              "Di min",
              Quantities.of(
                  "least_inside_diameter",
                  "",
                  Dimension.LENGTH,
                  3,
                  TorsionState::leastInsideDiameter)),
          new Column<>(
              "Lb",
              Quantities.of(
                  "loaded_body", "", Dimension.LENGTH, 2, state -> state.greatest().bodyLength())),
          column("legs", "leg_angle"),
          column("index", "spring_index"),
          column("mass", "mass"),
          column("cost", "cost_index"));

  private static Column<TorsionState> column(String head, String stem) {
    return new Column<>(head, Quantities.in(TorsionQuantities.SPRING, stem));
  }

  @Override
  public Synthesis<TorsionState> synthesis() {
    return new TorsionSearch();
  }

  @Override
  public String title() {
    return "Torsion spring";
  }

  @Override
  public String ends(String endForm) {
    return endForm.replace('-', ' ');
  }

  @Override
  public List<SpringPart<TorsionState>> parts(Problem problem) {
    return List.of(
        SpringPart.of(TorsionQuantities.SPRING),
        SpringPart.of(SpringFields.group(problem)),
        SpringPart.of(List.of(SpringFields.data())),
        SpringPart.list(
            "loads",
            "load",
            asked(problem).loads().size(),
            TorsionQuantities.LOAD,
            TorsionState::loads));
  }

  @Override
  public List<Field<Design>> design() {
    return TorsionProblemJson.DESIGN;
  }

  @Override
  public void addSpring(TextTable table, TorsionState spring, OutputUnits units) {
    for (Quantity<TorsionState> one : TorsionQuantities.SPRING) {
      if (Double.isFinite(one.of().applyAsDouble(spring))) {
        one.addTo(table, spring, units);
      }
    }
  }

  @Override
  public TextTable loads(TorsionState spring, OutputUnits units) {
    return new LoadTable<>(TorsionQuantities.LOAD, units).addAll(spring.loads()).table();
  }

  @Override
  public List<Column<TorsionState>> columns(Problem problem) {
    return COLUMNS;
  }

  @Override
  public String legend() {
    return "nb body coils, D mean and De outside diameter when free, Di min the least inside diameter,\n"
        + "  Lb the body length at the greatest torque, legs the angle between them when free;";
  }

  @Override
  public List<Note<TorsionState>> notes(Problem problem) {
    return List.of(
        new Note<>(
            "body of few coils: friction and the ends tell more than the body; try one first",
            TorsionState::fewCoils),
        new Note<>(
            "no angle between the legs is asked: check the one they come to when free",
            state -> asked(problem).legs().angle().isEmpty()));
  }

  @Override
  public List<String> generalNotes() {
    return List.of(
        "friction between coils and on an arbor is not reckoned, but for what the rate constant holds");
  }

  @Override
  public void understandLoads(Understood words) {
    new TorsionWords(words).loads();
  }

  @Override
  public void understandSpace(Understood words, List<String> space) {
    words.bound(space, "body length up to", asked(words.problem()).maxBodyLength());
  }

  @Override
  public void understandEnds(Understood words) {
    new TorsionWords(words).legs();
  }

  @Override
  public void understandDesign(Understood words) {
    new TorsionWords(words).legAngle();
  }

  /** {@inheritDoc} An angle between the legs fixes whole coils and a fraction. */
  @Override
  public boolean stepsCoils(Problem problem) {
    return asked(problem).legs().angle().isEmpty();
  }

  @Override
  public String restsOnDensity() {
    return "mass and cost rest";
  }

  @Override
  public boolean roundsLength(Problem problem) {
    return false;
  }

  @Override
  public void understandLimits(Understood words) {
    new TorsionWords(words).limits();
  }

  @Override
  public void writeRequired(Json json, Problem problem) throws IOException {
    TorsionProblemJson.required(json, asked(problem));
  }

  @Override
  public void writeLoads(Json json, Problem problem) throws IOException {
    TorsionProblemJson.loads(json, asked(problem));
  }

  @Override
  public void writeSpace(Json json, Problem problem) throws IOException {
    ProblemValues.optional(json, "max_body_length_mm", asked(problem).maxBodyLength());
  }

  @Override
  public void writeEnds(Json json, Problem problem) throws IOException {
    TorsionProblemJson.legs(json, asked(problem).legs());
  }

  @Override
  public void writeDesign(Json json, Design design) throws IOException {
    json.number("body_coils", design.coils());
    TorsionProblemJson.legs(json, ((TorsionDesign) design).legs());
  }

  @Override
  public void writeLimits(Json json, Problem problem) throws IOException {
    TorsionProblemJson.limits(json, problem);
  }

  private static TorsionAsked asked(Problem problem) {
    return problem.torsion().orElseThrow();
  }
}
