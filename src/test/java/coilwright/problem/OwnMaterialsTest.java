package coilwright.problem;

import static org.assertj.core.api.Assertions.assertThat;

import coilwright.material.AllowableClass;
import coilwright.material.DiameterRange;
import coilwright.material.GradeSource;
import coilwright.material.Supply;
import coilwright.material.WireGrade;
import coilwright.material.WireSeries;
import coilwright.material.WireSize;
import coilwright.source.Evidence;
import java.util.List;
import org.assertj.core.data.Offset;
import org.junit.jupiter.api.Test;

/** Grades that a file defines. */
class OwnMaterialsTest {

  private static final WireGrade MUSIC_WIRE = Files.CATALOGUE.grade("music-wire");
  private static final GradeSource OWN_STRENGTH =
      new GradeSource("strength", "problem file", Evidence.SEEN);

  @Test
  void takesWhatIsNotGivenFromTheOtherGrade() {
    WireGrade grade = only("{id: lot-1, like: music-wire, tensile_strength: 1900 MPa}");
    assertThat(grade.id()).isEqualTo("lot-1");
    assertThat(grade.supply()).isEqualTo(Supply.ANY);
    assertThat(grade.common()).isTrue();
    assertThat(grade.allowableClass()).isEqualTo(MUSIC_WIRE.allowableClass());
    assertThat(grade.diameters()).isEqualTo(MUSIC_WIRE.diameters());
    assertThat(grade.density()).isEqualTo(MUSIC_WIRE.density());
    assertThat(grade.costIndex()).isEqualTo(MUSIC_WIRE.costIndex());
    assertThat(grade.usualSeries()).isEqualTo(MUSIC_WIRE.usualSeries());
    assertThat(grade.maxServiceTemperature()).isEqualTo(MUSIC_WIRE.maxServiceTemperature());
    assertThat(grade.strength().at(1)).isEqualTo(1900);
    assertThat(grade.shearModulus().at(1)).isEqualTo(MUSIC_WIRE.shearModulus().at(1));
    assertThat(grade.elasticModulus().at(1)).isEqualTo(MUSIC_WIRE.elasticModulus().at(1));
    assertThat(grade.sources()).contains(OWN_STRENGTH);
    assertThat(grade.sources().stream().filter(source -> source.what().equals("strength")))
        .hasSize(1);
    assertThat(grade.sources()).hasSameSizeAs(MUSIC_WIRE.sources());
  }

  @Test
  void nothingGivenIsTheOtherGradeByAnotherName() {
    WireGrade grade = only("{id: lot-1, like: music-wire}");
    assertThat(grade.strength()).isSameAs(MUSIC_WIRE.strength());
    assertThat(grade.sources()).isEqualTo(MUSIC_WIRE.sources());
  }

  @Test
  void everythingGivenNeedsNoOtherGrade() {
    WireGrade grade =
        only(
            """
            {id: lot-1, tensile_strength: {a: 2211 MPa, m: 0.145}, diameters: {min: 0.5 mm, max: 6 mm},
              shear_modulus: 80 GPa, elastic_modulus: 200 GPa, density: 7.85 g/cm^3, cost_index: 2.0,
              stress_at_load: 45 %, stress_at_solid: 50 %}
            """);
    assertThat(grade.strength().at(2))
        .isCloseTo(2211 / StrictMath.pow(2, 0.145), Offset.offset(1e-9));
    assertThat(grade.diameters()).isEqualTo(new DiameterRange(0.5, 6));
    assertThat(grade.shearModulus().at(2)).isEqualTo(80_000);
    assertThat(grade.elasticModulus().at(2)).isEqualTo(200_000);
    assertThat(grade.density()).isEqualTo(7850);
    assertThat(grade.costIndex()).isEqualTo(2);
    assertThat(grade.stressAtLoad()).hasValue(0.45);
    assertThat(grade.stressAtSolid()).hasValue(0.5);
    assertThat(grade.allowableClass()).isEqualTo(AllowableClass.NON_FERROUS);
    assertThat(grade.usualSeries()).containsExactly(WireSeries.METRIC);
    assertThat(grade.maxServiceTemperature()).isEmpty();
  }

  @Test
  void tablesHoldUpToAndIncludingTheirDiameters() {
    WireGrade grade =
        only(
            """
            {id: lot-1, like: music-wire,
              tensile_strength: [{up_to: 1 mm, strength: 2100 MPa}, {up_to: 3 mm, strength: 1900 MPa}],
              shear_modulus: [{up_to: 1 mm, modulus: 81 GPa}, {up_to: 2.5 mm, modulus: 80 GPa}]}
            """);
    assertThat(grade.strength().at(1)).isEqualTo(2100);
    assertThat(grade.strength().at(1.01)).isEqualTo(1900);
    assertThat(grade.shearModulus().at(1)).isEqualTo(81_000);
    assertThat(grade.shearModulus().at(2.5)).isEqualTo(80_000);
    assertThat(grade.diameters()).isEqualTo(new DiameterRange(MUSIC_WIRE.diameters().min(), 2.5));
  }

  @Test
  void diametersAreMergedBoundByBound() {
    double min = MUSIC_WIRE.diameters().min();
    assertThat(only("{id: a, like: music-wire, diameters: {max: 2 mm}}").diameters())
        .isEqualTo(new DiameterRange(min, 2));
    assertThat(
            only("{id: a, like: music-wire, tensile_strength: 2 GPa, diameters: {max: 20 mm}}")
                .diameters())
        .isEqualTo(new DiameterRange(min, 20));
  }

  @Test
  void oneMayBeLikeAnotherDefinedAbove() {
    List<WireGrade> grades =
        grades(
            """
            - {id: a, like: music-wire, tensile_strength: 2 GPa, stress_at_load: 40 %}
              - {id: b, like: a, density: 8 g/cm^3}
            """);
    assertThat(grades).hasSize(2);
    assertThat(grades.get(1).strength().at(1)).isEqualTo(2000);
    assertThat(grades.get(1).stressAtLoad()).hasValue(0.4);
    assertThat(grades.get(1).density()).isEqualTo(8000);
  }

  @Test
  void everyWireThatIsOfferedCanBeDrawn() {
    WireGrade grade =
        only("{id: a, like: music-wire, elastic_modulus: [{up_to: 1 mm, modulus: 203 GPa}]}");
    double end = grade.diameters().max();
    assertThat(grade.drawnTo(WireSize.explicit("1 mm", end)).elasticModulus()).isEqualTo(203_000);
  }

  @Test
  void anOwnGradeMayBeNamed() {
    Problem problem =
        Files.problem(
            Files.LOADS
                + "own_materials: [{id: lot-1, like: music-wire}]\n"
                + "make: {materials: [lot-1]}\n");
    assertThat(problem.make().materials()).containsExactly("lot-1");
  }

  private static WireGrade only(String grade) {
    List<WireGrade> grades = grades("- " + grade);
    assertThat(grades).hasSize(1);
    return grades.get(0);
  }

  private static List<WireGrade> grades(String list) {
    return Files.problem(Files.LOADS + "own_materials:\n  " + list + "\n").ownMaterials();
  }
}
