package coilwright.search;

import coilwright.material.Supply;
import coilwright.material.WireGrade;
import coilwright.material.WireSize;
import coilwright.problem.Band;
import coilwright.problem.Design;
import coilwright.problem.DesignLimits;
import coilwright.problem.Envelope;
import coilwright.problem.LegsAsked;
import coilwright.problem.LoadFacts;
import coilwright.problem.Make;
import coilwright.problem.Problem;
import coilwright.problem.RankBy;
import coilwright.problem.StressLimit;
import coilwright.problem.TorqueAsked;
import coilwright.problem.TorqueFacts;
import coilwright.problem.TorqueLine;
import coilwright.problem.TorsionAsked;
import coilwright.problem.UnitSystem;
import coilwright.spring.AngularRate;
import coilwright.spring.EndType;
import coilwright.spring.Hand;
import coilwright.spring.Kind;
import coilwright.spring.Method;
import coilwright.spring.Rounding;
import coilwright.spring.TorquePoint;
import java.util.ArrayList;
import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;

/**
 * A problem of a torsion spring in the making: what a metric problem file means by default, changed
 * word by word. All numbers are in the program's inner units and for one spring.
 */
public final class TorsionDraft {

  private boolean closing = true;
  private double rate = 10;
  private OptionalDouble freeAngle = OptionalDouble.of(0);
  private List<TorquePoint> loads = List.of();
  private boolean fixed = true;
  private TorqueFacts facts = noFacts();
  private LegsAsked legs = new LegsAsked(0, 0, OptionalDouble.empty(), 1);
  private double constant = AngularRate.HANDBOOK;
  private Method method = Method.HANDBOOK;
  private final Map<TorsionBound, Double> bounds = new EnumMap<>(TorsionBound.class);
  private boolean stressJudged = true;
  private List<String> materials = List.of();
  private boolean allMaterials;
  private List<WireGrade> ownMaterials = List.of();
  private List<WireSize> sizes = List.of();
  private double coilStep = 0.25;
  private double coating;
  private Rounding rounding = new Rounding(0.01, 0.1, 0.001, 0.01);
  private Optional<Design> design = Optional.empty();
  private int springs = 1;

  /** A draft with the default limits of a problem file. */
  public TorsionDraft() {
    bounds.put(TorsionBound.LEAST_INDEX, 5.0);
    bounds.put(TorsionBound.GREATEST_INDEX, 12.0);
    bounds.put(TorsionBound.FEWEST_COILS, 3.0);
    bounds.put(TorsionBound.MOST_COILS, 60.0);
  }

  private static TorqueFacts noFacts() {
    OptionalDouble none = OptionalDouble.empty();
    return new TorqueFacts(none, none, none);
  }

  /** Another draft that says the same. */
  public TorsionDraft copy() {
    TorsionDraft copy = new TorsionDraft();
    copy.closing = closing;
    copy.rate = rate;
    copy.freeAngle = freeAngle;
    copy.loads = loads;
    copy.fixed = fixed;
    copy.facts = facts;
    copy.legs = legs;
    copy.constant = constant;
    copy.method = method;
    copy.bounds.clear();
    copy.bounds.putAll(bounds);
    copy.stressJudged = stressJudged;
    copy.materials = materials;
    copy.allMaterials = allMaterials;
    copy.ownMaterials = ownMaterials;
    copy.sizes = sizes;
    copy.coilStep = coilStep;
    copy.coating = coating;
    copy.rounding = rounding;
    copy.design = design;
    copy.springs = springs;
    return copy;
  }

  /** The loads unwind the spring. Say so before the loads. */
  public TorsionDraft opening() {
    closing = false;
    return this;
  }

  /** A rate [N mm/rad], and loads at deflections from a free angle [rad]. */
  public TorsionDraft loads(double slope, double free, double... deflections) {
    rate = slope;
    freeAngle = OptionalDouble.of(free);
    loads = new ArrayList<>();
    for (double deflection : deflections) {
      double angle = closing ? free + deflection : free - deflection;
      loads.add(new TorquePoint(OptionalDouble.of(angle), OptionalDouble.of(slope * deflection)));
    }
    return this;
  }

  /** A rate [N mm/rad], and torques at whatever angle [N mm]. */
  public TorsionDraft torques(double slope, double... torques) {
    rate = slope;
    freeAngle = OptionalDouble.empty();
    loads = new ArrayList<>();
    for (double torque : torques) {
      loads.add(new TorquePoint(OptionalDouble.empty(), OptionalDouble.of(torque)));
    }
    return this;
  }

  /** Loads that fix no line, as a file for checking may give them. */
  public TorsionDraft unfixed(TorqueFacts more, TorquePoint... points) {
    fixed = false;
    facts = more;
    loads = List.of(points);
    return this;
  }

  /** How many springs share the loads. */
  public TorsionDraft springs(int parallel) {
    springs = parallel;
    return this;
  }

  /** The lengths of the legs [mm]. */
  public TorsionDraft legs(double first, double second) {
    legs = new LegsAsked(first, second, OptionalDouble.empty(), 1);
    return this;
  }

  /** The lengths of the legs [mm], and their angle at a load [rad]. */
  public TorsionDraft legs(double first, double second, double angle, int atLoad) {
    legs = new LegsAsked(first, second, OptionalDouble.of(angle), atLoad);
    return this;
  }

  /** The constant of the rate [-]. */
  public TorsionDraft constant(double c) {
    constant = c;
    return this;
  }

  /** Whose conventions apply. */
  public TorsionDraft method(Method rules) {
    method = rules;
    return this;
  }

  /** Sets a bound. */
  public TorsionDraft with(TorsionBound bound, double value) {
    bounds.put(bound, value);
    return this;
  }

  /** Leaves bounds open; a stress without one has that of its basis. */
  public TorsionDraft without(TorsionBound... unwanted) {
    for (TorsionBound bound : unwanted) {
      bounds.remove(bound);
    }
    return this;
  }

  /** Judges no stress. */
  public TorsionDraft stressOff() {
    stressJudged = false;
    return this;
  }

  /** A bound, where one is set. */
  public OptionalDouble bound(TorsionBound bound) {
    return bounds.containsKey(bound)
        ? OptionalDouble.of(bounds.get(bound))
        : OptionalDouble.empty();
  }

  /** The grades tried: ids of the catalogue. Own grades are tried besides. */
  public TorsionDraft materials(List<String> ids) {
    materials = List.copyOf(ids);
    return this;
  }

  /** Every grade of the catalogue. */
  public TorsionDraft allMaterials() {
    allMaterials = true;
    return this;
  }

  /** Grades that the problem brings. */
  public TorsionDraft own(WireGrade... grades) {
    ownMaterials = List.of(grades);
    return this;
  }

  /** The wire sizes tried [mm]. */
  public TorsionDraft sizes(double... diameters) {
    sizes = new ArrayList<>();
    for (double diameter : diameters) {
      sizes.add(WireSize.explicit(diameter + " mm", diameter));
    }
    return this;
  }

  /** The step of the coil count [-]. */
  public TorsionDraft coilStep(double step) {
    coilStep = step;
    return this;
  }

  /** The steps of the mean diameter. */
  public TorsionDraft rounding(Rounding steps) {
    rounding = steps;
    return this;
  }

  /** The thickness of what covers the wire [mm]. */
  public TorsionDraft coating(double thickness) {
    coating = thickness;
    return this;
  }

  /** The spring to check. */
  public TorsionDraft design(Design given) {
    design = Optional.of(given);
    return this;
  }

  /** The problem. */
  public Problem problem() {
    OptionalDouble none = OptionalDouble.empty();
    return new Problem(
        "draft",
        Kind.TORSION,
        UnitSystem.METRIC,
        new LoadFacts(List.of(), none, none, none, springs),
        Optional.empty(),
        none,
        envelope(),
        Optional.empty(),
        make(),
        design,
        limits(),
        Optional.empty(),
        Optional.of(asked()),
        ownMaterials,
        RankBy.MASS,
        10);
  }

  private TorsionAsked asked() {
    List<TorqueAsked> given =
        loads.stream().map(load -> new TorqueAsked(load, Optional.empty())).toList();
    return new TorsionAsked(
        closing,
        given,
        facts,
        fixed ? Optional.of(new TorqueLine(rate, freeAngle, "drafted", loads)) : Optional.empty(),
        legs,
        bound(TorsionBound.BODY_LENGTH),
        new StressLimit(stressJudged, bound(TorsionBound.STRESS)),
        constant);
  }

  private Envelope envelope() {
    return new Envelope(
        bound(TorsionBound.BORE),
        bound(TorsionBound.ROD),
        bound(TorsionBound.CLEARANCE),
        bound(TorsionBound.OUTSIDE_DIAMETER),
        bound(TorsionBound.INSIDE_DIAMETER),
        OptionalDouble.empty(),
        OptionalDouble.empty());
  }

  private Make make() {
    List<String> named = new ArrayList<>(materials);
    ownMaterials.forEach(grade -> named.add(grade.id()));
    return new Make(
        Supply.ANY,
        named,
        allMaterials,
        List.of(),
        List.of(),
        sizes,
        List.of(EndType.SQUARED_GROUND),
        Hand.EITHER,
        false,
        coating,
        coilStep,
        rounding);
  }

  private DesignLimits limits() {
    DesignLimits usual = DesignLimits.DEFAULTS;
    return new DesignLimits(
        new Band(bound(TorsionBound.LEAST_INDEX), bound(TorsionBound.GREATEST_INDEX)),
        new Band(bound(TorsionBound.FEWEST_COILS), bound(TorsionBound.MOST_COILS)),
        usual.maxPitchAngle(),
        usual.clashAllowance(),
        false,
        method,
        usual.stressCorrection(),
        usual.stressAtLoad(),
        usual.stressAtSolid(),
        usual.buckling(),
        OptionalDouble.empty());
  }

  @Override
  public String toString() {
    return bounds
        + (closing ? " closing" : " opening")
        + ", rate "
        + rate
        + ", free "
        + freeAngle
        + ", "
        + loads
        + ", "
        + legs
        + ", step "
        + coilStep
        + ", "
        + rounding
        + ", "
        + method
        + ", coating "
        + coating;
  }
}
