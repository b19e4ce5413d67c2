package coilwright.limit;

import static coilwright.published.Published.Column.CLASS;
import static coilwright.published.Published.Column.STRENGTH;
import static coilwright.published.Published.Column.STRESS;
import static org.assertj.core.api.Assertions.assertThat;

import coilwright.material.AllowableClass;
import coilwright.problem.StressLimit;
import coilwright.published.Published;
import coilwright.spring.SampleWire;
import coilwright.unit.Dimension;
import java.util.OptionalDouble;
import java.util.stream.Stream;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** The static shares of tensile strength against published ones. */
class PublishedAllowableTest {

  static Stream<Published> shares() {
    return Published.ofGroup("allowables", CLASS);
  }

  @ParameterizedTest(name = "{0}")
  @MethodSource("shares")
  void shareIsAsPublished(Published row) {
    AllowableClass allowableClass = AllowableClass.valueOf(row.text(CLASS));
    double share =
        Allowable.atLoad(
                new StressLimit(true, OptionalDouble.empty()),
                SampleWire.grade(allowableClass, OptionalDouble.empty(), OptionalDouble.empty()),
                StressBasis.HANDBOOK)
            .share();
    assertThat(share * row.inner(STRENGTH, Dimension.STRESS))
        .isCloseTo(row.inner(STRESS, Dimension.STRESS), row.closeness());
  }
}
