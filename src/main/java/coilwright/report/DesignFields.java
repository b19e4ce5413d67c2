package coilwright.report;

import coilwright.problem.CompressionDesign;
import coilwright.unit.Dimension;
import java.util.List;
import java.util.function.ToDoubleFunction;

/**
 * What is left to say of a spring whose grade has no data for its wire: without a strength nothing
 * else can be judged.
 */
final class DesignFields {

  /** In the order of the output. */
  static final List<Field<CompressionDesign>> ALL =
      List.of(
          Word.users("material", CompressionDesign::material),
          Word.users("wire_size", design -> design.wireSize().label()),
          Word.ours("ends", design -> design.ends().id()),
          length("wire_diameter", design -> design.wireSize().diameter()),
          length("mean_diameter", CompressionDesign::meanDiameter),
          CompressionQuantities.number("active_coils", "", 2, CompressionDesign::coils),
          length("free_length", CompressionDesign::freeLength));

  private DesignFields() {}

  private static Quantity<CompressionDesign> length(
      String stem, ToDoubleFunction<CompressionDesign> of) {
    return CompressionQuantities.of(stem, "", Dimension.LENGTH, 3, of);
  }
}
