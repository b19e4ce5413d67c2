package coilwright.limit;

import coilwright.problem.Envelope;
import coilwright.problem.ExtensionAsked;
import coilwright.problem.HookLength;
import coilwright.problem.LimitName;
import coilwright.source.Citation;
import coilwright.source.Source;
import coilwright.spring.ExtensionSpring;
import coilwright.spring.ExtensionState;
import coilwright.spring.Family;
import coilwright.unit.Dimension;
import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;
import java.util.function.Function;
import java.util.function.ToDoubleFunction;

/** The limits that the space and the hooks' own shape set for extension springs. */
final class ExtensionSpace {

  private static final Citation SLACK =
      Citation.seen(Source.FIRST_PRINCIPLES, "a spring longer than the place it works in is slack");

  private final Clearance clearance;
  private final String covered;
  private final List<Limit<ExtensionState>> limits = new ArrayList<>();

  private ExtensionSpace(Envelope space, String covered) {
    this.clearance = new Clearance(space);
    this.covered = covered;
  }

  /**
   * Diameters and free length, in the order of the names.
   *
   * @param space the space
   * @param covered what a definition says of the wire's coating, after a comma; empty if bare
   */
  static List<Limit<ExtensionState>> ofBody(Envelope space, String covered) {
    ExtensionSpace all = new ExtensionSpace(space, covered);
    all.clearances();
    all.add(
        LimitName.OUTSIDE_DIAMETER,
        Side.MAX,
        "nominal, free state",
        state -> state.spring().outsideDiameter(),
        space.maxOutsideDiameter());
    all.add(
        LimitName.INSIDE_DIAMETER,
        Side.MIN,
        "nominal, free state",
        state -> state.spring().insideDiameter(),
        space.minInsideDiameter());
    all.add(
        LimitName.FREE_LENGTH,
        Side.MAX,
        "inside the hooks",
        ExtensionState::freeLength,
        space.maxFreeLength(),
        family -> new AlongExtension(family).turnsOfFreeLength());
    all.limits.add(new NotSlack());
    return all.limits;
  }

  /**
   * What concerns the hooks, in the order of the names.
   *
   * @param asked what only extension springs are asked
   * @param covered what a definition says of the wire's coating, after a comma; empty if bare
   * @param overtravel whether there is an overtravel beyond the loads
   */
  static List<Limit<ExtensionState>> ofHooks(
      ExtensionAsked asked, Envelope space, String covered, boolean overtravel) {
    ExtensionSpace all = new ExtensionSpace(space, covered);
    if (asked.hooks().length().rule() != HookLength.Rule.NATURAL) {
      all.hookLength();
    }
    all.add(
        LimitName.EXTENDED_LENGTH,
        Side.MAX,
        "inside the hooks, at the greatest load" + (overtravel ? ", overtravel included" : ""),
        ExtensionState::extremeLength,
        asked.maxExtendedLength(),
        family -> new AlongExtension(family).turnsOfExtendedLength());
    all.add(
        LimitName.PIN,
        Side.MIN,
        "inside of the hook"
            + covered
            + ", across the loop or from the body, which the pin must pass",
        state -> state.spring().loopInside(),
        asked.pin(),
        family -> new AlongExtension(family).turnsOfHookInside());
    return all.limits;
  }

  private void add(
      LimitName name,
      Side side,
      String definition,
      ToDoubleFunction<ExtensionState> value,
      OptionalDouble bound) {
    add(name, side, definition, value, bound, family -> new double[0]);
  }

  private void add(
      LimitName name,
      Side side,
      String definition,
      ToDoubleFunction<ExtensionState> value,
      OptionalDouble bound,
      Function<Family<ExtensionState>, double[]> turns) {
    if (bound.isPresent()) {
      double at = bound.getAsDouble();
      limits.add(
          new ValueLimit<>(
              new Check(name, side, Dimension.LENGTH, definition),
              value,
              state -> at,
              Clearance.ASKED,
              false,
              turns));
    }
  }

  private void clearances() {
    ToDoubleFunction<ExtensionState> mean = state -> state.spring().meanDiameter();
    clearance
        .bore(
            "outside diameter, free state, since pulling narrows the coil" + covered,
            state -> state.spring().meanDiameter() + state.spring().coatedDiameter(),
            mean,
            clearance.source())
        .ifPresent(limits::add);
    clearance
        .rod(
            LimitName.ROD,
            "free state" + covered,
            state -> state.spring().meanDiameter() - state.spring().coatedDiameter(),
            mean,
            clearance.source(),
            this::steps)
        .ifPresent(limits::add);
  }

  private double[] steps(Family<ExtensionState> family, double rod) {
    AlongExtension along = new AlongExtension(family);
    ExtensionSpring any = along.any().spring();
    return clearance.steps(rod + any.coatedDiameter(), any.wireDiameter(), along.curve()::coilsAt);
  }

  private void hookLength() {
    limits.add(
        new ValueLimit<>(
            new Check(
                LimitName.HOOK_LENGTH,
                Side.MIN,
                Dimension.LENGTH,
                "beyond the body, against the shortest hook of its type" + covered),
            state -> state.spring().hookLength(),
            state -> state.spring().leastHookLength(),
            Citation.seen(Source.FIRST_PRINCIPLES, "a hook reaches at least as far as its bend"),
            false,
            family -> new AlongExtension(family).turnsOfHookLength()));
  }

  /** The free length against the shortest loaded length: else it bears nothing there. */
  private record NotSlack() implements Limit<ExtensionState> {

    private static final Check CHECK =
        new Check(
            LimitName.FREE_LENGTH,
            Side.MAX,
            Dimension.LENGTH,
            "inside the hooks, against the shortest loaded length: below it the coils have not"
                + " parted");

    @Override
    public Check check() {
      return CHECK;
    }

    @Override
    public boolean removable() {
      return false;
    }

    @Override
    public Finding judge(ExtensionState state) {
      return Finding.of(CHECK, state.freeLength(), state.shortestLength(), SLACK);
    }

    @Override
    public double[] turns(Family<ExtensionState> family) {
      return new AlongExtension(family).turnsOfFreeLength();
    }
  }
}
