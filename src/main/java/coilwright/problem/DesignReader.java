package coilwright.problem;

import coilwright.spring.EndType;
import coilwright.spring.Method;
import java.util.Optional;

/**
 * Reads the one compression spring that a check judges.
 *
 * @param ids the grades that may be named
 * @param section its block of keys
 * @param method decides which ends can be judged
 */
record DesignReader(MaterialIds ids, Section section, Method method) {

  /**
   * Reads the spring.
   *
   * @return the spring, or empty where it is faulty
   */
  Optional<CompressionDesign> read() {
    long before = section.spot().faults().count();
    Optional<DesignBasics> basics = DesignBasics.read(ids, section);
    Optional<EndType> ends = section.require(DesignKeys.ENDS);
    ends.ifPresent(formed -> ClosedEnds.check(formed, method, section.spot(DesignKeys.ENDS)));
    Optional<Double> activeCoils = activeCoils(ends);
    Optional<Double> freeLength = section.require(DesignKeys.FREE_LENGTH);
    boolean setRemoved = section.read(DesignKeys.SET_REMOVED).orElse(false);
    if (section.spot().faults().count() > before) {
      return Optional.empty();
    }
    return basics.map(
        common ->
            new CompressionDesign(
                common.material(),
                common.wire(),
                common.meanDiameter(),
                activeCoils.get(),
                freeLength.get(),
                ends.get(),
                common.hand(),
                setRemoved,
                common.coating()));
  }

  private Optional<Double> activeCoils(Optional<EndType> ends) {
    Optional<ProblemKey<Double>> key = DesignBasics.only(section, DesignKeys.COILS);
    Optional<Double> given = key.flatMap(section::read);
    if (key.isEmpty() || key.get() == DesignKeys.ACTIVE_COILS || ends.isEmpty()) {
      return given;
    }
    int dead = ends.get().deadCoils();
    if (given.isPresent() && !(given.get() > dead)) {
      section
          .spot(key.get())
          .fault(
              section.shown(key.get()),
              "must be above the " + dead + " dead coils of " + ends.get().id() + " ends");
    }
    return given.map(total -> total - dead);
  }
}
