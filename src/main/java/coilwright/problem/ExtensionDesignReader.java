package coilwright.problem;

import coilwright.spring.HookType;
import java.util.List;
import java.util.Optional;

/**
 * Reads the one extension spring that a check judges.
 *
 * @param ids the grades that may be named
 * @param section its block of keys
 */
record ExtensionDesignReader(MaterialIds ids, Section section) {

  /**
   * Reads the spring.
   *
   * @return the spring, or empty where it is faulty
   */
  Optional<ExtensionDesign> read() {
    long before = section.spot().faults().count();
    Optional<DesignBasics> basics = DesignBasics.read(ids, section);
    Optional<Double> coils = section.require(DesignKeys.BODY_COILS);
    Optional<Double> tension = section.require(DesignKeys.INITIAL_TENSION);
    Optional<HookType> type = section.require(HookKeys.DESIGNED);
    HookLength length = section.read(HookKeys.DESIGNED_LENGTH).orElse(HookLength.natural());
    HooksAsked hooks =
        HooksReader.read(
            Optional.of(section), type.map(List::of).orElse(List.of()), length, LoopPlanes.ANY);
    basics.ifPresent(common -> inside(common, hooks));
    if (section.spot().faults().count() > before) {
      return Optional.empty();
    }
    return basics.map(
        common ->
            new ExtensionDesign(
                common.material(),
                common.wire(),
                common.meanDiameter(),
                coils.get(),
                tension.get(),
                hooks,
                common.hand(),
                common.coating()));
  }

  /** A bend whose mean radius is no more than half its wire has no inside. */
  private void inside(DesignBasics spring, HooksAsked hooks) {
    boolean side = hooks.sideRadius() <= hooks.bendRadius();
    double share = side ? hooks.sideRadius() : hooks.bendRadius();
    double covered = spring.wire().diameter() + 2 * spring.coating();
    if (!(2 * share * spring.meanDiameter() > covered)) {
      section
          .spot(side ? HookKeys.SIDE_RADIUS : HookKeys.BEND_RADIUS)
          .fault(
              share + " of the mean diameter",
              "must be more than half the wire diameter, "
                  + section.shown(DesignKeys.WIRE_DIAMETER)
                  + (spring.coating() > 0 ? ", and its coating" : ""));
    }
  }
}
