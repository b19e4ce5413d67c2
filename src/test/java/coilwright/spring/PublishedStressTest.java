package coilwright.spring;

import static coilwright.published.Published.Column.ACTIVE_COILS;
import static coilwright.published.Published.Column.CORRECTION;
import static coilwright.published.Published.Column.ENDS;
import static coilwright.published.Published.Column.FORCE;
import static coilwright.published.Published.Column.FREE_LENGTH;
import static coilwright.published.Published.Column.MEAN_DIAMETER;
import static coilwright.published.Published.Column.SHEAR_MODULUS;
import static coilwright.published.Published.Column.STRESS;
import static coilwright.published.Published.Column.WIRE_DIAMETER;
import static org.assertj.core.api.Assertions.assertThat;

import coilwright.published.Published;
import coilwright.unit.Dimension;
import java.util.List;
import java.util.stream.Stream;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** The shear stress, corrected and not, against published springs. */
class PublishedStressTest {

  static Stream<Published> underAForce() {
    return Published.ofGroup("stress", FORCE);
  }

  static Stream<Published> atSolid() {
    return Published.ofGroup("stress", FREE_LENGTH);
  }

  @ParameterizedTest(name = "{0}")
  @MethodSource("underAForce")
  void stressIsAsPublished(Published row) {
    double d = row.inner(WIRE_DIAMETER, Dimension.LENGTH);
    double meanDiameter = row.inner(MEAN_DIAMETER, Dimension.LENGTH);
    double uncorrected =
        ShearStress.uncorrected(row.inner(FORCE, Dimension.FORCE), meanDiameter, d);
    assertThat(uncorrected * factor(row, meanDiameter / d))
        .isCloseTo(row.inner(STRESS, Dimension.STRESS), row.closeness());
  }

  @ParameterizedTest(name = "{0}")
  @MethodSource("atSolid")
  void stressAtSolidIsAsPublished(Published row) {
    CompressionSpring spring =
        new CompressionSpring(
            SampleWire.of(
                row.inner(WIRE_DIAMETER, Dimension.LENGTH),
                row.inner(SHEAR_MODULUS, Dimension.STRESS)),
            row.inner(MEAN_DIAMETER, Dimension.LENGTH),
            row.number(ACTIVE_COILS),
            row.inner(FREE_LENGTH, Dimension.LENGTH),
            EndType.of(row.text(ENDS)).orElseThrow());
    Duty duty =
        new Duty(
            List.of(LoadPoint.at(spring.freeLength(), 0)),
            StressCorrection.BERGSTRAESSER,
            Seating.FIXED_FIXED);
    assertThat(new CompressionState(spring, duty).solid().correctedShearStress())
        .isCloseTo(row.inner(STRESS, Dimension.STRESS), row.closeness());
  }

  private static double factor(Published row, double index) {
    return Stream.of(StressCorrection.values())
        .filter(each -> each.id().equals(row.text(CORRECTION)))
        .mapToDouble(each -> each.at(index))
        .findFirst()
        .orElse(1);
  }
}
