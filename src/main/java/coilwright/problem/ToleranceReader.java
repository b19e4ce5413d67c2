package coilwright.problem;

import coilwright.spring.Kind;
import coilwright.unit.Dimension;
import coilwright.unit.Quantity;
import java.util.List;
import java.util.Optional;

/** Reads a tolerance: the same on both sides of the load, or each side for itself. */
final class ToleranceReader implements ValueReader<ToleranceAsked> {

  private final QuantityReader both;
  private final boolean torque;

  /**
   * A reader of tolerances.
   *
   * @param load what the load is: a force or a torque
   */
  ToleranceReader(Dimension load) {
    this.torque = load == Dimension.TORQUE;
    this.both = new QuantityReader(Range.ABOVE_ZERO, load, Dimension.SHARE);
  }

  @Override
  public Optional<ToleranceAsked> read(Node node, Spot spot) {
    if (node instanceof Node.Sequence) {
      spot.refuse(node, accepted());
      return Optional.empty();
    }
    return node instanceof Node.Mapping
        ? Section.open(node, spot).flatMap(this::sides)
        : both.read(node, spot).map(side -> new ToleranceAsked(side, side));
  }

  private Optional<ToleranceAsked> sides(Section section) {
    Optional<Quantity> plus = section.require(torque ? TorqueKeys.PLUS : LoadKeys.PLUS);
    Optional<Quantity> minus = section.require(torque ? TorqueKeys.MINUS : LoadKeys.MINUS);
    if (plus.isEmpty() || minus.isEmpty()) {
      return Optional.empty();
    }
    if (plus.get().number() == 0 && minus.get().number() == 0) {
      section.spot().fault("zero on both sides", "must be above zero on one side at least");
    }
    return Optional.of(new ToleranceAsked(plus.get(), minus.get()));
  }

  @Override
  public String accepted() {
    return both.accepted() + ", or {plus, minus} of such";
  }

  @Override
  public Form form(Kind kind) {
    return new Form.Either(List.of(both.form(kind), Forms.block(kind, "loads[].tolerance")));
  }
}
