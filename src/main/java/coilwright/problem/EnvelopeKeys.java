package coilwright.problem;

import coilwright.spring.Kind;
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
              "16 mm")
          .only(Kind.COMPRESSION);

  static final ProblemKey<Double> BORE_OF_EXTENSION =
      ProblemKey.of(
              "envelope.bore",
              Values.length(),
              "no bore",
              "hole it works in: the coil without load, when it is widest, clears it",
              "16 mm")
          .only(Kind.EXTENSION);

  static final ProblemKey<Double> BORE_OF_TORSION =
      ProblemKey.of(
              "envelope.bore",
              Values.length(),
              "no bore",
              "hole it works in: the coil clears it at its widest, free or unwound",
              "24 mm")
          .only(Kind.TORSION);

  static final ProblemKey<Double> ROD =
      ProblemKey.of(
              "envelope.rod",
              Values.length(),
              "no rod",
              "shaft through it: the inside diameter clears it",
              "8 mm")
          .only(Kind.COMPRESSION, Kind.EXTENSION);

  static final ProblemKey<Double> ARBOR =
      ProblemKey.of(
              "envelope.rod",
              Values.length(),
              "no arbor",
              "shaft through it, the arbor: the coil clears it at its narrowest, wound up or free",
              "10 mm")
          .only(Kind.TORSION);

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
              "45 mm")
          .only(Kind.COMPRESSION);

  static final ProblemKey<Double> MAX_FREE_LENGTH_INSIDE_HOOKS =
      ProblemKey.of(
              "envelope.max_free_length",
              Values.length(),
              "no limit",
              "greatest length without load, inside the hooks",
              "50 mm")
          .only(Kind.EXTENSION);

  static final ProblemKey<Double> MAX_EXTENDED_LENGTH =
      ProblemKey.of(
              "envelope.max_extended_length",
              Values.length(),
              "no limit",
              "greatest length inside the hooks, at the greatest load or the overtravel",
              "70 mm")
          .only(Kind.EXTENSION);

  static final ProblemKey<Double> PIN =
      ProblemKey.of(
              "envelope.pin",
              Values.length(),
              "no pin",
              "diameter of a pin that must pass the hook",
              "6 mm")
          .only(Kind.EXTENSION);

  static final ProblemKey<Double> MAX_BODY_LENGTH =
      ProblemKey.of(
              "envelope.max_body_length",
              Values.length(),
              "no limit",
              "greatest length of the coiled body at the greatest torque",
              "20 mm")
          .only(Kind.TORSION);

  static final ProblemKey<Double> MAX_SOLID_LENGTH =
      ProblemKey.of(
              "envelope.max_solid_length",
              Values.length(),
              "no limit",
              "greatest length with all coils touching",
              "18 mm")
          .only(Kind.COMPRESSION);

  static final ProblemKey<Seating> SEATS =
      ProblemKey.of(
              "seats",
              new WordReader<>(List.of(Seating.values()), Seating::id),
              "fixed-fixed for squared-ground ends, else pinned-pinned",
              "how the two ends are held",
              "fixed-fixed")
          .only(Kind.COMPRESSION);

  /** All of them. */
  static final List<ProblemKey<?>> ROWS =
      List.of(
          ENVELOPE,
          BORE,
          BORE_OF_EXTENSION,
          BORE_OF_TORSION,
          ROD,
          ARBOR,
          CLEARANCE,
          MAX_OUTSIDE_DIAMETER,
          MIN_INSIDE_DIAMETER,
          MAX_FREE_LENGTH,
          MAX_FREE_LENGTH_INSIDE_HOOKS,
          MAX_SOLID_LENGTH,
          MAX_EXTENDED_LENGTH,
          PIN,
          MAX_BODY_LENGTH,
          SEATS);

  private EnvelopeKeys() {}
}
