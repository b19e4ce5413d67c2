package coilwright.report;

import coilwright.limit.Finding;
import coilwright.problem.BucklingRule;
import coilwright.problem.Problem;
import coilwright.search.Candidate;
import coilwright.spring.CompressionState;
import coilwright.spring.LoadState;
import coilwright.unit.Dimension;
import java.util.List;
import java.util.Optional;

/**
 * The values of a compression spring that JSON and CSV hold beside its {@link
 * CompressionQuantities}, each declared once, in the order of the output.
 */
final class CompressionFields {

  /** Which spring it is. */
  static final List<Field<Candidate<CompressionState>>> IDENTITY =
      List.of(
          Word.users("id", CompressionQuantities::id),
          Word.users("material", spring -> spring.state().wire().grade().id()),
          new Word<>(
              "wire_series",
              false,
              spring -> spring.state().wire().size().series().map(series -> series.id())),
          Word.users("wire_size", spring -> spring.state().wire().size().label()),
          Word.ours("ends", spring -> spring.state().endForm()));

  /** What it rests on. */
  static final List<Field<CompressionState>> BASIS =
      List.of(
          Word.ours("data", state -> state.wire().evidence().word()),
          Word.ours("seats", state -> state.seating().id()));

  /** What is known of it pressed solid. */
  static final List<Field<LoadState>> SOLID =
      List.of(
          CompressionQuantities.ofLoad("force"),
          CompressionQuantities.ofLoad("shear_stress"),
          CompressionQuantities.ofLoad("corrected_shear_stress"));

  /** Its growth. */
  static final List<Field<CompressionState>> GROWTH =
      List.of(CompressionQuantities.OUTSIDE_DIAMETER_AT_SOLID);

  /** What its checks come to. */
  static final List<Field<Candidate<CompressionState>>> SUMMARY =
      List.of(
          CompressionQuantities.number(
              "least_margin", "", 3, spring -> spring.leastMargin().orElse(Double.NaN)),
          new Word<>("limiting_check", false, CompressionFields::limiting));

  private CompressionFields() {}

  private static Optional<String> limiting(Candidate<CompressionState> spring) {
    return spring.limiting().map(Finding::check).map(check -> check.limit().text());
  }

  /** The mass of all springs side by side; nothing where there is one. */
  static List<Field<CompressionState>> group(Problem problem) {
    int parallel = problem.facts().springsInParallel();
    return parallel == 1
        ? List.of()
        : List.of(
            CompressionQuantities.of(
                "group_mass", "", Dimension.MASS, 3, state -> state.mass() * parallel));
  }

  /** Whether it would buckle, as the problem judges it. */
  static Field<CompressionState> stable(Problem problem) {
    boolean atSolid = problem.limits().buckling() == BucklingRule.AT_SOLID;
    return new Flag<>("stable", state -> state.stableAt(atSolid ? state.solid() : state.extreme()));
  }
}
