package coilwright.report;

import coilwright.limit.Finding;
import coilwright.material.Wire;
import coilwright.problem.Problem;
import coilwright.rank.Cost;
import coilwright.search.Candidate;
import coilwright.spring.State;
import coilwright.unit.Dimension;
import java.util.List;
import java.util.Optional;
import java.util.function.ToDoubleFunction;

/** The values that every kind of spring has, each declared once for JSON and CSV. */
final class SpringFields {

  /** Which spring it is. */
  static final List<Field<Candidate<?>>> IDENTITY =
      List.of(
          Word.users("id", Quantities::id),
          Word.users("material", spring -> spring.state().wire().grade().id()),
          new Word<>(
              "wire_series",
              false,
              spring -> spring.state().wire().size().series().map(series -> series.id())),
          Word.users("wire_size", spring -> spring.state().wire().size().label()),
          Word.ours("ends", spring -> spring.state().endForm()));

  /** What its checks come to. */
  static final List<Field<Candidate<?>>> SUMMARY =
      List.of(
          Quantities.number(
              "least_margin", "", 3, spring -> spring.leastMargin().orElse(Double.NaN)),
          new Word<>("limiting_check", false, SpringFields::limiting));

  private SpringFields() {}

  private static Optional<String> limiting(Candidate<?> spring) {
    return spring.limiting().map(Finding::check).map(check -> check.limit().text());
  }

  /** Whether what it is made of was seen or is from memory. */
  static <S extends State> Field<S> data() {
    return Word.ours("data", state -> state.wire().evidence().word());
  }

  /** The mass of all springs side by side; nothing where there is one. */
  static <S extends State> List<Field<S>> group(Problem problem) {
    int parallel = problem.facts().springsInParallel();
    return parallel == 1
        ? List.of()
        : List.of(
            Quantities.of("group_mass", "", Dimension.MASS, 3, state -> state.mass() * parallel));
  }

  /** Its mass. */
  static <S extends State> Quantity<S> mass() {
    return Quantities.of("mass", "mass", Dimension.MASS, 3, State::mass);
  }

  /** Its cost proxy. */
  static <S extends State> Quantity<S> cost() {
    return Quantities.number("cost_index", "cost proxy", 2, state -> Cost.of(state).total());
  }

  /** Developed length of its wire. */
  static <S extends State> Quantity<S> wireLength() {
    return Quantities.of("wire_length", "wire length", Dimension.LENGTH, 1, State::wireLength);
  }

  /** Wire diameter. */
  static <S extends State> Quantity<S> wireDiameter() {
    return Quantities.of(
        "wire_diameter", "wire diameter d", Dimension.LENGTH, 3, state -> state.wire().diameter());
  }

  /** Tensile strength of its wire. */
  static <S extends State> Quantity<S> tensileStrength() {
    return stress("tensile_strength", "tensile strength Rm", Wire::tensileStrength);
  }

  /** Shear modulus of its wire. */
  static <S extends State> Quantity<S> shearModulus() {
    return stress("shear_modulus", "shear modulus G", Wire::shearModulus);
  }

  /** Modulus of elasticity of its wire. */
  static <S extends State> Quantity<S> elasticModulus() {
    return stress("elastic_modulus", "elastic modulus E", Wire::elasticModulus);
  }

  private static <S extends State> Quantity<S> stress(
      String stem, String label, ToDoubleFunction<Wire> of) {
    return Quantities.of(stem, label, Dimension.STRESS, 0, state -> of.applyAsDouble(state.wire()));
  }
}
