package coilwright.docs;

import static org.assertj.core.api.Assertions.assertThat;

import coilwright.material.Catalogue;
import coilwright.material.WireSeries;
import coilwright.problem.LimitName;
import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Map;
import java.util.SortedSet;
import java.util.TreeSet;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;

/** README.md names every key of the JSON output, every limit, every grade and every series. */
class ReadmeNamesTest {

  @Test
  void everyJsonKeyIsNamed() throws IOException {
    String readme = Readme.text();
    for (String key : keys()) {
      assertThat(readme).as(key).contains("`" + key + "`");
    }
  }

  @ParameterizedTest
  @EnumSource(LimitName.class)
  void everyLimitIsNamed(LimitName name) throws IOException {
    assertThat(Readme.text()).contains("`" + name.text() + "`");
  }

  @Test
  void everyGradeAndEverySeriesIsNamed() throws IOException {
    String readme = Readme.text();
    Catalogue.load().gradeIds().forEach(id -> assertThat(readme).contains("`" + id + "`"));
    for (WireSeries series : WireSeries.values()) {
      assertThat(readme).contains("| `" + series.id() + "` |");
    }
  }

  private static SortedSet<String> keys() throws IOException {
    SortedSet<String> keys = new TreeSet<>();
    for (Path result : Results.present()) {
      if (result.toString().endsWith(".json")) {
        add(keys, new ObjectMapper().readTree(Files.readAllBytes(result)));
      }
    }
    return keys;
  }

  /** The keys of a tree; inside "problem" they are those of the problem file. */
  private static void add(SortedSet<String> keys, JsonNode node) {
    for (Map.Entry<String, JsonNode> entry : node.properties()) {
      keys.add(entry.getKey());
      if (!entry.getKey().equals("problem")) {
        add(keys, entry.getValue());
      }
    }
    if (node.isArray()) {
      node.forEach(element -> add(keys, element));
    }
  }
}
