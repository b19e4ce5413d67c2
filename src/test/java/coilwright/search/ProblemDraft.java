package coilwright.search;

import coilwright.material.Supply;
import coilwright.material.WireGrade;
import coilwright.material.WireSize;
import coilwright.problem.Band;
import coilwright.problem.BucklingRule;
import coilwright.problem.DesignLimits;
import coilwright.problem.Envelope;
import coilwright.problem.LoadAsked;
import coilwright.problem.LoadFacts;
import coilwright.problem.Make;
import coilwright.problem.Problem;
import coilwright.problem.RankBy;
import coilwright.problem.Requirement;
import coilwright.problem.StressLimit;
import coilwright.problem.UnitSystem;
import coilwright.spring.EndType;
import coilwright.spring.Hand;
import coilwright.spring.Kind;
import coilwright.spring.LoadLine;
import coilwright.spring.LoadPoint;
import coilwright.spring.Method;
import coilwright.spring.Rounding;
import coilwright.spring.Seating;
import coilwright.spring.StressCorrection;
import java.util.ArrayList;
import java.util.EnumMap;
import java.util.EnumSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.Set;

/**
 * A problem in the making: what a metric problem file means by default, changed word by word. All
 * numbers are in the program's inner units and for one spring.
 */
public final class ProblemDraft {

  private LoadLine line = new LoadLine(1, 50);
  private List<LoadPoint> loads = List.of();
  private final Map<Bound, Double> bounds = new EnumMap<>(Bound.class);
  private final Set<Bound> off = EnumSet.noneOf(Bound.class);
  private Optional<Seating> seats = Optional.empty();
  private BucklingRule buckling = BucklingRule.AT_LOAD_UNLESS_GUIDED;
  private StressCorrection correction = StressCorrection.BERGSTRAESSER;
  private List<String> materials = List.of();
  private List<WireGrade> ownMaterials = List.of();
  private List<WireSize> sizes = List.of();
  private List<EndType> ends = List.of(EndType.SQUARED_GROUND, EndType.SQUARED);
  private double coilStep = 0.25;
  private Method method = Method.HANDBOOK;
  private boolean setRemoved;
  private double coating;
  private OptionalDouble overtravel = OptionalDouble.empty();
  private boolean open;
  private Rounding rounding = new Rounding(0.01, 0.1, 0.001, 0.01);

  /** A draft with the default limits of a problem file. */
  public ProblemDraft() {
    bounds.put(Bound.LEAST_INDEX, 5.0);
    bounds.put(Bound.GREATEST_INDEX, 12.0);
    bounds.put(Bound.FEWEST_COILS, 3.0);
    bounds.put(Bound.MOST_COILS, 60.0);
    bounds.put(Bound.PITCH_ANGLE, Math.toRadians(12));
    bounds.put(Bound.CLASH_ALLOWANCE, 0.15);
  }

  /** Another draft that says the same. */
  public ProblemDraft copy() {
    ProblemDraft copy = new ProblemDraft();
    copy.line = line;
    copy.loads = loads;
    copy.bounds.clear();
    copy.bounds.putAll(bounds);
    copy.off.addAll(off);
    copy.seats = seats;
    copy.buckling = buckling;
    copy.correction = correction;
    copy.materials = materials;
    copy.ownMaterials = ownMaterials;
    copy.sizes = sizes;
    copy.ends = ends;
    copy.coilStep = coilStep;
    copy.rounding = rounding;
    copy.method = method;
    copy.setRemoved = setRemoved;
    copy.coating = coating;
    copy.overtravel = overtravel;
    copy.open = open;
    return copy;
  }

  /** The load line, and loads on it at lengths [mm]. */
  public ProblemDraft loads(LoadLine on, double... lengths) {
    line = on;
    loads = new ArrayList<>();
    for (double length : lengths) {
      loads.add(LoadPoint.at(length, on.forceAt(length)));
    }
    return this;
  }

  /** Sets a bound. */
  public ProblemDraft with(Bound bound, double value) {
    bounds.put(bound, value);
    off.remove(bound);
    return this;
  }

  /** Switches a bound off. */
  public ProblemDraft without(Bound... unwanted) {
    for (Bound bound : unwanted) {
      bounds.remove(bound);
      off.add(bound);
    }
    return this;
  }

  /** A bound, where one is set. A stress without one has that of its grade, unless switched off. */
  public OptionalDouble bound(Bound bound) {
    return bounds.containsKey(bound)
        ? OptionalDouble.of(bounds.get(bound))
        : OptionalDouble.empty();
  }

  /** How the ends are held. */
  public ProblemDraft seats(Seating held) {
    seats = Optional.of(held);
    return this;
  }

  /** Where stability is judged. */
  public ProblemDraft buckling(BucklingRule rule) {
    buckling = rule;
    return this;
  }

  /** Which factor corrects the stress. */
  public ProblemDraft correction(StressCorrection factor) {
    correction = factor;
    return this;
  }

  /** The grades tried: ids of the catalogue. Own grades are tried besides. */
  public ProblemDraft materials(List<String> ids) {
    materials = List.copyOf(ids);
    return this;
  }

  /** Grades that the problem brings. */
  public ProblemDraft own(WireGrade... grades) {
    ownMaterials = List.of(grades);
    return this;
  }

  /** The wire sizes tried [mm]. */
  public ProblemDraft sizes(double... diameters) {
    sizes = new ArrayList<>();
    for (double diameter : diameters) {
      sizes.add(WireSize.explicit(diameter + " mm", diameter));
    }
    return this;
  }

  /** The end types tried. */
  public ProblemDraft ends(EndType... tried) {
    ends = List.of(tried);
    return this;
  }

  /** The step of the coil count [-]. */
  public ProblemDraft coilStep(double step) {
    coilStep = step;
    return this;
  }

  /** The steps of mean diameter and free length. */
  public ProblemDraft rounding(Rounding steps) {
    rounding = steps;
    return this;
  }

  /** Whose conventions apply. */
  public ProblemDraft method(Method rules) {
    method = rules;
    return this;
  }

  /** Pressed solid once before use. */
  public ProblemDraft setRemoved() {
    setRemoved = true;
    return this;
  }

  /** The thickness of what covers the wire [mm]. */
  public ProblemDraft coating(double thickness) {
    coating = thickness;
    return this;
  }

  /** A length to survive beyond the loads [mm]. */
  public ProblemDraft overtravel(double length) {
    overtravel = OptionalDouble.of(length);
    return this;
  }

  /** Asks the loads at their deflections only; the lengths are left open. */
  public ProblemDraft lengthsOpen() {
    open = true;
    return this;
  }

  /** The problem. */
  public Problem problem() {
    return new Problem(
        "draft",
        Kind.COMPRESSION,
        UnitSystem.METRIC,
        facts(),
        Optional.of(requirement()),
        overtravel,
        envelope(),
        seats,
        make(),
        Optional.empty(),
        limits(),
        Optional.empty(),
        Optional.empty(),
        ownMaterials,
        RankBy.MASS,
        10);
  }

  private Requirement requirement() {
    if (!open) {
      OptionalDouble free = OptionalDouble.of(line.freeLength());
      return new Requirement(line.rate(), free, "drafted", loads);
    }
    List<LoadPoint> deflected = new ArrayList<>();
    for (LoadPoint load : loads) {
      double force = load.force().orElseThrow();
      deflected.add(LoadPoint.deflected(force / line.rate(), force));
    }
    return new Requirement(line.rate(), OptionalDouble.empty(), "drafted", deflected);
  }

  private LoadFacts facts() {
    List<LoadAsked> asked =
        loads.stream()
            .map(load -> new LoadAsked(load.length(), load.force(), Optional.empty()))
            .toList();
    OptionalDouble none = OptionalDouble.empty();
    return new LoadFacts(asked, none, none, none, 1);
  }

  private Envelope envelope() {
    return new Envelope(
        bound(Bound.BORE),
        bound(Bound.ROD),
        bound(Bound.CLEARANCE),
        bound(Bound.OUTSIDE_DIAMETER),
        bound(Bound.INSIDE_DIAMETER),
        bound(Bound.FREE_LENGTH),
        bound(Bound.SOLID_LENGTH));
  }

  private Make make() {
    List<String> named = new ArrayList<>(materials);
    ownMaterials.forEach(grade -> named.add(grade.id()));
    return new Make(
        Supply.ANY,
        named,
        false,
        List.of(),
        List.of(),
        sizes,
        ends,
        Hand.EITHER,
        setRemoved,
        coating,
        coilStep,
        rounding);
  }

  private DesignLimits limits() {
    return new DesignLimits(
        new Band(bound(Bound.LEAST_INDEX), bound(Bound.GREATEST_INDEX)),
        new Band(bound(Bound.FEWEST_COILS), bound(Bound.MOST_COILS)),
        bound(Bound.PITCH_ANGLE),
        bound(Bound.CLASH_ALLOWANCE),
        method == Method.EN_13906 && !off.contains(Bound.CLASH_ALLOWANCE),
        method,
        correction,
        stress(Bound.STRESS_AT_LOAD),
        stress(Bound.STRESS_AT_SOLID),
        buckling,
        bound(Bound.SURGE_FREQUENCY));
  }

  private StressLimit stress(Bound bound) {
    return new StressLimit(!off.contains(bound), bound(bound));
  }

  @Override
  public String toString() {
    return bounds
        + " "
        + buckling
        + " "
        + correction
        + " "
        + coilStep
        + " "
        + rounding
        + " "
        + method
        + (setRemoved ? ", set removed" : "")
        + (open ? ", lengths open" : "")
        + ", coating "
        + coating
        + ", overtravel "
        + overtravel;
  }
}
