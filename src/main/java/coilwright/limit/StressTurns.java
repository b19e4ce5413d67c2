package coilwright.limit;

import coilwright.spring.CompressionState;
import coilwright.spring.Family;
import java.util.Arrays;
import java.util.function.DoubleUnaryOperator;

/**
 * Where the corrected stress may turn along a family. Of a given force it is least at the index
 * where the factor's growth overtakes the shrinking coil, near 1.9; only below that index does it
 * turn.
 */
final class StressTurns {

  private static final int SAMPLES = 16;

  private StressTurns() {}

  static double[] atLoad(Family<CompressionState> family, StressMeaning meaning) {
    AlongFamily along = new AlongFamily(family);
    if (along.lengthsOpen() && along.any().duty().overtravel().isPresent()) {
      return sampled(
          family, coils -> along.stress(coils, along.deflectionAtExtreme(coils), meaning));
    }
    return ofConstantForce(along, meaning);
  }

  private static double[] ofConstantForce(AlongFamily along, StressMeaning meaning) {
    return meaning == StressMeaning.CORRECTED
        ? new double[] {along.coilsAtIndex(along.any().correction().leastStressIndex())}
        : new double[0];
  }

  private static double[] sampled(Family<CompressionState> family, DoubleUnaryOperator stress) {
    return Extremes.between(family.fewestCoils(), family.mostCoils(), stress);
  }

  /**
   * The stress at solid falls with the deflection left and with the coil, until the coil is so
   * tight that the factor grows faster; it may then rise and fall again before the coils touch when
   * free. A sample of that stretch shows where. Where the lengths follow from the travel, the
   * deflection to solid is constant or grows with the sum of gaps.
   */
  static double[] atSolid(Family<CompressionState> family, StressMeaning meaning) {
    AlongFamily along = new AlongFamily(family);
    if (along.lengthsOpen()) {
      return along.any().duty().travel().get().gapSum()
          ? sampled(family, coils -> along.stress(coils, along.deflectionToSolid(coils), meaning))
          : ofConstantForce(along, meaning);
    }
    return meaning == StressMeaning.CORRECTED
        ? untilSolid(family, along)
        : new double[] {along.coilsSolidWhenFree()};
  }

  private static double[] untilSolid(Family<CompressionState> family, AlongFamily along) {
    double from = along.coilsAtIndex(along.any().correction().leastStressIndex());
    double solid = along.coilsSolidWhenFree();
    double to = Math.min(solid, family.mostCoils());
    double[] turns = new double[SAMPLES + 1];
    int count = 0;
    turns[count++] = solid;
    double before = Double.POSITIVE_INFINITY;
    boolean falls = true;
    for (int i = 0; i < SAMPLES && to > from; i++) {
      double coils = from + (to - from) * i / (SAMPLES - 1);
      double stress = along.stress(coils, along.deflectionToSolid(coils), StressMeaning.CORRECTED);
      if (stress < before != falls) {
        falls = !falls;
        turns[count++] = coils - (to - from) / (SAMPLES - 1);
      }
      before = stress;
    }
    return Arrays.copyOf(turns, count);
  }
}
