package coilwright.problem;

import coilwright.spring.Seating;
import coilwright.unit.Dimension;
import java.util.List;

/** The keys about the space and how the spring is held in it. */
final class EnvelopeKeys {

  static final ProblemKey<Section> ENVELOPE =
      ProblemKey.section("envelope", "no bounds", "the space; leave out what does not matter");

  static final ProblemKey<Double> BORE =
      ProblemKey.of(
          "envelope.bore",
          Values.length(),
          "no bore",
          "hole it works in: the coil, grown by compression, clears it",
          "16 mm");

  static final ProblemKey<Double> ROD =
      ProblemKey.of(
          "envelope.rod",
          Values.length(),
          "no rod",
          "shaft through it: the inside diameter clears it",
          "8 mm");

  static final ProblemKey<Double> CLEARANCE =
      ProblemKey.of(
          "envelope.diametral_clearance",
          Values.quantity(Dimension.LENGTH, Range.FROM_ZERO),
          "coil diameter tolerance of EN 15800 grade 2, assumed",
          "between coil and bore, and coil and rod",
          "0.4 mm");

  static final ProblemKey<Double> MAX_OUTSIDE_DIAMETER =
      ProblemKey.of(
          "envelope.max_outside_diameter",
          Values.length(),
          "no limit",
          "plain limit, nominal, without load",
          "15.5 mm");

  static final ProblemKey<Double> MIN_INSIDE_DIAMETER =
      ProblemKey.of(
          "envelope.min_inside_diameter",
          Values.length(),
          "no limit",
          "plain limit, nominal, without load",
          "8.5 mm");

  static final ProblemKey<Double> MAX_FREE_LENGTH =
      ProblemKey.of(
          "envelope.max_free_length",
          Values.length(),
          "no limit",
          "greatest length without load",
          "45 mm");

  static final ProblemKey<Double> MAX_SOLID_LENGTH =
      ProblemKey.of(
          "envelope.max_solid_length",
          Values.length(),
          "no limit",
          "greatest length with all coils touching",
          "18 mm");

  static final ProblemKey<Seating> SEATS =
      ProblemKey.of(
          "seats",
          new WordReader<>(List.of(Seating.values()), Seating::id),
          "fixed-fixed for squared-ground ends, else pinned-pinned",
          "how the two ends are held",
          "fixed-fixed");

  /** All of them. */
  static final List<ProblemKey<?>> ROWS =
      List.of(
          ENVELOPE,
          BORE,
          ROD,
          CLEARANCE,
          MAX_OUTSIDE_DIAMETER,
          MIN_INSIDE_DIAMETER,
          MAX_FREE_LENGTH,
          MAX_SOLID_LENGTH,
          SEATS);

  private EnvelopeKeys() {}
}
