package coilwright.search;

import coilwright.material.Supply;
import coilwright.material.WireGrade;
import coilwright.material.WireSize;
import coilwright.problem.Band;
import coilwright.problem.BucklingRule;
import coilwright.problem.Design;
import coilwright.problem.DesignLimits;
import coilwright.problem.Envelope;
import coilwright.problem.ExtensionAsked;
import coilwright.problem.HookLength;
import coilwright.problem.HooksAsked;
import coilwright.problem.LoadFacts;
import coilwright.problem.LoopPlanes;
import coilwright.problem.Make;
import coilwright.problem.Problem;
import coilwright.problem.RankBy;
import coilwright.problem.StressLimit;
import coilwright.problem.TensionLine;
import coilwright.problem.UnitSystem;
import coilwright.spring.Hand;
import coilwright.spring.HookType;
import coilwright.spring.Kind;
import coilwright.spring.LoadPoint;
import coilwright.spring.Method;
import coilwright.spring.Rounding;
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
 * A problem of an extension spring in the making: what a metric problem file means by default,
 * changed word by word. All numbers are in the program's inner units and for one spring.
 */
public final class ExtensionDraft {

  private double rate = 1;
  private double zeroForceLength = 50;
  private boolean open;
  private List<LoadPoint> loads = List.of();
  private OptionalDouble freeLength = OptionalDouble.empty();
  private final Map<ExtensionBound, Double> bounds = new EnumMap<>(ExtensionBound.class);
  private final Set<ExtensionBound> off = EnumSet.noneOf(ExtensionBound.class);
  private HookLength hookLength = HookLength.natural();
  private List<HookType> hooks = List.of(HookType.FULL_LOOP);
  private double bendRadius = 0.5;
  private double sideRadius = 0.25;
  private LoopPlanes planes = LoopPlanes.ANY;
  private OptionalDouble hookActive = OptionalDouble.empty();
  private boolean preferred = true;
  private StressCorrection correction = StressCorrection.BERGSTRAESSER;
  private Method method = Method.HANDBOOK;
  private List<String> materials = List.of();
  private boolean all;
  private List<WireGrade> ownMaterials = List.of();
  private List<WireSize> sizes = List.of();
  private double coilStep = 0.25;
  private double coating;
  private OptionalDouble overtravel = OptionalDouble.empty();
  private Rounding rounding = new Rounding(0.01, 0.1, 0.001, 0.01);
  private Optional<Design> design = Optional.empty();

  /** A draft with the default limits of a problem file. */
  public ExtensionDraft() {
    bounds.put(ExtensionBound.LEAST_INDEX, 5.0);
    bounds.put(ExtensionBound.GREATEST_INDEX, 12.0);
    bounds.put(ExtensionBound.FEWEST_COILS, 3.0);
  }

  /** Another draft that says the same. */
  public ExtensionDraft copy() {
    ExtensionDraft copy = new ExtensionDraft();
    copy.rate = rate;
    copy.zeroForceLength = zeroForceLength;
    copy.open = open;
    copy.loads = loads;
    copy.freeLength = freeLength;
    copy.bounds.clear();
    copy.bounds.putAll(bounds);
    copy.off.addAll(off);
    copy.hookLength = hookLength;
    copy.hooks = hooks;
    copy.bendRadius = bendRadius;
    copy.sideRadius = sideRadius;
    copy.planes = planes;
    copy.hookActive = hookActive;
    copy.preferred = preferred;
    copy.correction = correction;
    copy.method = method;
    copy.materials = materials;
    copy.all = all;
    copy.ownMaterials = ownMaterials;
    copy.sizes = sizes;
    copy.coilStep = coilStep;
    copy.coating = coating;
    copy.overtravel = overtravel;
    copy.rounding = rounding;
    copy.design = design;
    return copy;
  }

  /** The line of the loads, by its rate [N/mm] and where it comes to no force [mm]; the loads. */
  public ExtensionDraft loads(double ratio, double zero, double... lengths) {
    rate = ratio;
    zeroForceLength = zero;
    loads = new ArrayList<>();
    for (double length : lengths) {
      loads.add(LoadPoint.at(length, ratio * (length - zero)));
    }
    return this;
  }

  /** Asks the loads by their force alone; the lengths are left open. */
  public ExtensionDraft lengthsOpen() {
    open = true;
    return this;
  }

  /** The free length [mm], which free hooks follow. */
  public ExtensionDraft freeLength(double length) {
    freeLength = OptionalDouble.of(length);
    return this;
  }

  /** Sets a bound. */
  public ExtensionDraft with(ExtensionBound bound, double value) {
    bounds.put(bound, value);
    off.remove(bound);
    return this;
  }

  /** Switches a bound off. */
  public ExtensionDraft without(ExtensionBound... unwanted) {
    for (ExtensionBound bound : unwanted) {
      bounds.remove(bound);
      off.add(bound);
    }
    return this;
  }

  /** A bound, where one is set. */
  public OptionalDouble bound(ExtensionBound bound) {
    return bounds.containsKey(bound)
        ? OptionalDouble.of(bounds.get(bound))
        : OptionalDouble.empty();
  }

  /** How far the hooks reach. */
  public ExtensionDraft hookLength(HookLength length) {
    hookLength = length;
    return this;
  }

  /** The kinds of hooks tried. */
  public ExtensionDraft hooks(HookType... types) {
    hooks = List.of(types);
    return this;
  }

  /** The radii of the hooks, as multiples of the mean diameter [-]. */
  public ExtensionDraft radii(double bend, double side) {
    bendRadius = bend;
    sideRadius = side;
    return this;
  }

  /** How the hooks lie to each other. */
  public ExtensionDraft planes(LoopPlanes lie) {
    planes = lie;
    return this;
  }

  /** Active coils that each hook adds [-]. */
  public ExtensionDraft hookActive(double coils) {
    hookActive = OptionalDouble.of(coils);
    return this;
  }

  /** Any initial tension that is not negative. */
  public ExtensionDraft anyTension() {
    preferred = false;
    return this;
  }

  /** Which factor corrects the stress of the body. */
  public ExtensionDraft correction(StressCorrection factor) {
    correction = factor;
    return this;
  }

  /** Whose allowables apply. */
  public ExtensionDraft method(Method rules) {
    method = rules;
    return this;
  }

  /** The grades tried: ids of the catalogue. Own grades are tried besides. */
  public ExtensionDraft materials(List<String> ids) {
    materials = List.copyOf(ids);
    return this;
  }

  /** Every grade of the catalogue. */
  public ExtensionDraft allMaterials() {
    all = true;
    return this;
  }

  /** Grades that the problem brings. */
  public ExtensionDraft own(WireGrade... grades) {
    ownMaterials = List.of(grades);
    return this;
  }

  /** The wire sizes tried [mm]. */
  public ExtensionDraft sizes(double... diameters) {
    sizes = new ArrayList<>();
    for (double diameter : diameters) {
      sizes.add(WireSize.explicit(diameter + " mm", diameter));
    }
    return this;
  }

  /** The step of the coil count [-]. */
  public ExtensionDraft coilStep(double step) {
    coilStep = step;
    return this;
  }

  /** The thickness of what covers the wire [mm]. */
  public ExtensionDraft coating(double thickness) {
    coating = thickness;
    return this;
  }

  /** A length to survive beyond the loads [mm]. */
  public ExtensionDraft overtravel(double length) {
    overtravel = OptionalDouble.of(length);
    return this;
  }

  /** The steps of mean diameter and free length. */
  public ExtensionDraft rounding(Rounding steps) {
    rounding = steps;
    return this;
  }

  /** The spring to check. */
  public ExtensionDraft design(Design spring) {
    design = Optional.of(spring);
    return this;
  }

  /** The problem. */
  public Problem problem() {
    OptionalDouble none = OptionalDouble.empty();
    return new Problem(
        "draft",
        Kind.EXTENSION,
        UnitSystem.METRIC,
        new LoadFacts(List.of(), none, none, none, 1),
        Optional.empty(),
        overtravel,
        envelope(),
        Optional.empty(),
        make(),
        design,
        limits(),
        Optional.of(asked()),
        Optional.empty(),
        ownMaterials,
        RankBy.MASS,
        10);
  }

  private ExtensionAsked asked() {
    OptionalDouble zero = open ? OptionalDouble.empty() : OptionalDouble.of(zeroForceLength);
    return new ExtensionAsked(
        Optional.of(new TensionLine(rate, zero, "drafted", open ? forces() : loads)),
        freeLength,
        new HooksAsked(hooks, hookLength, bendRadius, sideRadius, planes, hookActive),
        preferred,
        stress(ExtensionBound.BODY_STRESS),
        stress(ExtensionBound.HOOK_BENDING),
        stress(ExtensionBound.HOOK_TORSION),
        bound(ExtensionBound.EXTENDED_LENGTH),
        bound(ExtensionBound.PIN));
  }

  private List<LoadPoint> forces() {
    return loads.stream().map(load -> new LoadPoint(OptionalDouble.empty(), load.force())).toList();
  }

  private Envelope envelope() {
    return new Envelope(
        bound(ExtensionBound.BORE),
        bound(ExtensionBound.ROD),
        bound(ExtensionBound.CLEARANCE),
        bound(ExtensionBound.OUTSIDE_DIAMETER),
        bound(ExtensionBound.INSIDE_DIAMETER),
        bound(ExtensionBound.FREE_LENGTH),
        OptionalDouble.empty());
  }

  private Make make() {
    List<String> named = new ArrayList<>(materials);
    ownMaterials.forEach(grade -> named.add(grade.id()));
    return new Make(
        Supply.ANY,
        named,
        all,
        List.of(),
        List.of(),
        sizes,
        List.of(),
        Hand.EITHER,
        false,
        coating,
        coilStep,
        rounding);
  }

  private DesignLimits limits() {
    StressLimit none = new StressLimit(false, OptionalDouble.empty());
    return new DesignLimits(
        new Band(bound(ExtensionBound.LEAST_INDEX), bound(ExtensionBound.GREATEST_INDEX)),
        new Band(bound(ExtensionBound.FEWEST_COILS), bound(ExtensionBound.MOST_COILS)),
        OptionalDouble.empty(),
        OptionalDouble.empty(),
        false,
        method,
        correction,
        none,
        none,
        BucklingRule.NONE,
        bound(ExtensionBound.SURGE_FREQUENCY));
  }

  private StressLimit stress(ExtensionBound bound) {
    return new StressLimit(!off.contains(bound), bound(bound));
  }

  @Override
  public String toString() {
    return bounds
        + (preferred ? "" : ", any tension")
        + ", hooks "
        + hookLength
        + ", radii "
        + bendRadius
        + " "
        + sideRadius
        + " "
        + planes
        + (open ? ", lengths open" : "")
        + ", free length "
        + freeLength
        + ", step "
        + coilStep
        + " "
        + rounding
        + " "
        + method
        + ", coating "
        + coating
        + ", overtravel "
        + overtravel
        + ", "
        + loads;
  }
}
