package coilwright.problem;

import coilwright.material.WireSize;
import coilwright.spring.EndType;
import coilwright.spring.Hand;
import coilwright.spring.Method;
import java.util.List;
import java.util.Optional;

/**
 * Reads the one spring that a check judges.
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
    Optional<String> material = section.require(DesignKeys.MATERIAL);
    material.ifPresent(id -> ids.check(id, section.spot(DesignKeys.MATERIAL)));
    Optional<WireSize> wire = section.require(DesignKeys.WIRE_DIAMETER);
    double coating =
        section
            .read(DesignKeys.COATING)
            .flatMap(inner -> inner.require(DesignKeys.COATING_THICKNESS))
            .orElse(0.0);
    Optional<Double> meanDiameter = wire.flatMap(size -> meanDiameter(size.diameter(), coating));
    if (wire.isEmpty()) {
      only(DesignKeys.DIAMETERS).ifPresent(section::read);
    }
    Optional<EndType> ends = section.require(DesignKeys.ENDS);
    ends.ifPresent(formed -> ClosedEnds.check(formed, method, section.spot(DesignKeys.ENDS)));
    Optional<Double> activeCoils = activeCoils(ends);
    Optional<Double> freeLength = section.require(DesignKeys.FREE_LENGTH);
    Hand hand = section.read(DesignKeys.HAND).orElse(Hand.EITHER);
    boolean setRemoved = section.read(DesignKeys.SET_REMOVED).orElse(false);
    if (section.spot().faults().count() > before) {
      return Optional.empty();
    }
    return Optional.of(
        new CompressionDesign(
            material.get(),
            wire.get(),
            meanDiameter.get(),
            activeCoils.get(),
            freeLength.get(),
            ends.get(),
            hand,
            setRemoved,
            coating));
  }

  private Optional<Double> meanDiameter(double wire, double coating) {
    Optional<ProblemKey<Double>> key = only(DesignKeys.DIAMETERS);
    Optional<Double> mean =
        key.flatMap(section::read)
            .map(given -> key.get() == DesignKeys.OUTSIDE_DIAMETER ? given - wire : given)
            .map(given -> key.get() == DesignKeys.INSIDE_DIAMETER ? given + wire : given);
    if (mean.isPresent() && !(mean.get() > wire + 2 * coating)) {
      section
          .spot(key.get())
          .fault(
              section.shown(key.get()),
              "must leave the mean diameter above the wire diameter, "
                  + section.shown(DesignKeys.WIRE_DIAMETER)
                  + (coating > 0 ? ", and its coating" : ""));
    }
    return mean;
  }

  private Optional<Double> activeCoils(Optional<EndType> ends) {
    Optional<ProblemKey<Double>> key = only(DesignKeys.COILS);
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

  private Optional<ProblemKey<Double>> only(List<ProblemKey<Double>> keys) {
    List<ProblemKey<Double>> given = keys.stream().filter(section::has).toList();
    String names = String.join(", ", keys.stream().map(ProblemKey::name).toList());
    if (given.isEmpty() && keys.stream().allMatch(section::lacks)) {
      section.spot(keys.get(0)).fault("missing", "must be given, or another of " + names);
    }
    if (given.isEmpty()) {
      section.spot().faults().again();
    }
    if (given.size() > 1) {
      section
          .spot(given.get(1))
          .fault("given beside " + given.get(0).name(), "must be only one of " + names);
    }
    return given.stream().findFirst();
  }
}
