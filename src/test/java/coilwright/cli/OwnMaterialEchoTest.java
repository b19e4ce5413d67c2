package coilwright.cli;

import static org.assertj.core.api.Assertions.assertThat;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import java.io.IOException;
import org.junit.jupiter.api.Test;

/** JSON says back what a file says of its own grades. */
class OwnMaterialEchoTest {

  @Test
  void strengthAndModuliInEachForm() throws IOException {
    assertEcho(
        """
        {id: lot-1, like: music-wire, tensile_strength: 1.9 GPa, shear_modulus: 80 GPa,
          elastic_modulus: 200 GPa}
        """,
        """
        {"id": "lot-1", "like": "music-wire", "tensile_strength_mpa": 1900.0,
          "shear_modulus_mpa": 80000.0, "elastic_modulus_mpa": 200000.0}
        """);
    assertEcho(
        "{id: lot-1, like: en-10270-1-sm, tensile_strength: {a: 2211 MPa, m: 0.145}}",
        """
        {"id": "lot-1", "like": "en-10270-1-sm", "tensile_strength_mpa": {"a": 2211.0, "m": 0.145},
          "shear_modulus_mpa": 81500.0}
        """);
    assertEcho(
        """
        {id: lot-1, like: music-wire,
          tensile_strength: [{up_to: 1 mm, strength: 2100 MPa}, {up_to: 3 mm, strength: 1900 MPa}],
          shear_modulus: [{up_to: 1 mm, modulus: 81 GPa}, {up_to: 3 mm, modulus: 80 GPa}]}
        """,
        """
        {"tensile_strength_mpa":
           [{"up_to_mm": 1.0, "strength_mpa": 2100.0}, {"up_to_mm": 3.0, "strength_mpa": 1900.0}],
         "shear_modulus_mpa":
           [{"up_to_mm": 1.0, "modulus_mpa": 81000.0}, {"up_to_mm": 3.0, "modulus_mpa": 80000.0}]}
        """);
  }

  @Test
  void aGradeOfItsOwnIsLikeNoOther() throws IOException {
    JsonNode echo =
        assertEcho(
            """
            {id: lot-1, tensile_strength: 1900 MPa, shear_modulus: 80 GPa, elastic_modulus: 200 GPa,
              diameters: {min: 0.5 mm, max: 6 mm}, density: 7850 kg/m^3, cost_index: 2.0,
              stress_at_load: 45 %, stress_at_solid: 50 %}
            """,
            """
            {"id": "lot-1", "tensile_strength_mpa": 1900.0,
              "diameters": {"min_mm": 0.5, "max_mm": 6.0}, "shear_modulus_mpa": 80000.0,
              "elastic_modulus_mpa": 200000.0, "density_kg_per_m3": 7850.0, "cost_index": 2.0,
              "stress_at_load": 0.45, "stress_at_solid": 0.5}
            """);
    assertThat(echo.has("like")).isFalse();
  }

  /** An interpolated strength has no such form; the last step of a modulus has no end. */
  @Test
  void whatIsTakenFromTheOtherGradeStandsWhereAFileCouldSayIt() throws IOException {
    JsonNode echo = assertEcho("{id: lot-1, like: music-wire}", "{\"like\": \"music-wire\"}");
    assertThat(echo.has("tensile_strength_mpa")).isFalse();
    JsonNode steps = echo.path("shear_modulus_mpa");
    assertThat(steps.size()).isEqualTo(4);
    assertThat(steps.get(0).path("up_to_mm").asDouble()).isEqualTo(0.032 * 25.4);
    assertThat(steps.get(3).has("up_to_mm")).isFalse();
    assertThat(steps.get(3).path("modulus_mpa").asDouble()).isBetween(79_900.0, 80_000.0);
  }

  /** Each key that is expected, whatever else is said. */
  private static JsonNode assertEcho(String grade, String expected) throws IOException {
    String problem =
        Run.VALVE.substring(0, Run.VALVE.indexOf("make:"))
            + "make: {materials: [lot-1], wire_sizes: [1.4 mm]}\nown_materials:\n- "
            + grade.strip()
            + "\n";
    JsonNode echo =
        Run.reading(problem, "shortlist", "-", "--format=json")
            .json()
            .path("problem")
            .path("own_materials")
            .path(0);
    for (var entry : new ObjectMapper().readTree(expected).properties()) {
      assertThat(echo.path(entry.getKey())).as(entry.getKey()).isEqualTo(entry.getValue());
    }
    return echo;
  }
}
