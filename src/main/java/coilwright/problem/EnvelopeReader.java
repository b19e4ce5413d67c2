package coilwright.problem;

import java.util.Optional;
import java.util.OptionalDouble;

/** Reads the space a spring must fit. */
final class EnvelopeReader {

  private EnvelopeReader() {}

  /**
   * Reads the envelope.
   *
   * @param given its block
   * @return the envelope; without bounds where the file has none
   */
  static Envelope read(Optional<Section> given) {
    if (given.isEmpty()) {
      OptionalDouble none = OptionalDouble.empty();
      return new Envelope(none, none, none, none, none, none, none);
    }
    Section section = given.get();
    Envelope envelope =
        new Envelope(
            section.number(EnvelopeKeys.BORE),
            section.number(EnvelopeKeys.ROD),
            section.number(EnvelopeKeys.CLEARANCE),
            section.number(EnvelopeKeys.MAX_OUTSIDE_DIAMETER),
            section.number(EnvelopeKeys.MIN_INSIDE_DIAMETER),
            section.number(EnvelopeKeys.MAX_FREE_LENGTH),
            section.number(EnvelopeKeys.MAX_SOLID_LENGTH));
    inside(section, EnvelopeKeys.BORE, EnvelopeKeys.ROD, envelope.bore(), envelope.rod());
    inside(
        section,
        EnvelopeKeys.MAX_OUTSIDE_DIAMETER,
        EnvelopeKeys.MIN_INSIDE_DIAMETER,
        envelope.maxOutsideDiameter(),
        envelope.minInsideDiameter());
    room(section, envelope);
    return envelope;
  }

  private static void inside(
      Section section,
      ProblemKey<Double> outerKey,
      ProblemKey<Double> innerKey,
      OptionalDouble outer,
      OptionalDouble inner) {
    boolean both = outer.isPresent() && inner.isPresent();
    if (both && !(outer.getAsDouble() > inner.getAsDouble())) {
      section
          .spot(outerKey)
          .fault(
              section.shown(outerKey),
              "must be above " + innerKey.name() + ", " + section.shown(innerKey));
    }
  }

  /** A clearance that fills the bore leaves no coil. */
  private static void room(Section section, Envelope envelope) {
    boolean both = envelope.bore().isPresent() && envelope.diametralClearance().isPresent();
    if (both && !(envelope.diametralClearance().getAsDouble() < envelope.bore().getAsDouble())) {
      section
          .spot(EnvelopeKeys.CLEARANCE)
          .fault(
              section.shown(EnvelopeKeys.CLEARANCE),
              "must be below bore, " + section.shown(EnvelopeKeys.BORE));
    }
  }
}
