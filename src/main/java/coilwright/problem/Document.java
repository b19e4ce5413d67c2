package coilwright.problem;

import com.fasterxml.jackson.core.JsonFactory;
import com.fasterxml.jackson.core.JsonLocation;
import com.fasterxml.jackson.core.JsonParser;
import com.fasterxml.jackson.core.JsonProcessingException;
import com.fasterxml.jackson.core.StreamReadConstraints;
import com.fasterxml.jackson.dataformat.yaml.YAMLFactory;
import java.io.IOException;
import java.util.Optional;
import org.yaml.snakeyaml.error.MarkedYAMLException;

/** Reads a text as YAML, or as JSON where its first sign is an opening brace. */
final class Document {

  private static final StreamReadConstraints ROOMY =
      StreamReadConstraints.builder()
          .maxNumberLength(SourceText.LARGEST)
          .maxNameLength(SourceText.LARGEST)
          .maxStringLength(SourceText.LARGEST)
          .build();

  private Document() {}

  /**
   * Reads a text.
   *
   * @param text the text of a problem file
   * @param faults takes what is refused; a syntax error stands alone there
   * @return the document, or empty where it cannot be read at all
   */
  static Optional<Node> read(String text, Faults faults) {
    boolean json = text.stripLeading().startsWith("{");
    try (JsonParser parser = json ? json(text) : yaml(text)) {
      int[] signs = json ? new int[0] : text.codePoints().toArray();
      return Optional.of(new EventWalk(parser, signs).document(faults));
    } catch (EventWalk.TooDeep deep) {
      alone(deep.mark(), "nested too deep", "a problem file needs five levels", faults);
    } catch (IOException broken) {
      Mark mark = markOf(broken);
      alone(mark, json ? "not readable as JSON" : whyNotYaml(text, mark), remedy(json), faults);
    }
    return Optional.empty();
  }

  private static JsonParser json(String text) throws IOException {
    return JsonFactory.builder().streamReadConstraints(ROOMY).build().createParser(text);
  }

  private static JsonParser yaml(String text) throws IOException {
    return YAMLFactory.builder().streamReadConstraints(ROOMY).build().createParser(text);
  }

  private static Mark markOf(IOException broken) {
    if (broken.getCause() instanceof MarkedYAMLException marked
        && marked.getProblemMark() != null) {
      return new Mark(
          marked.getProblemMark().getLine() + 1, marked.getProblemMark().getColumn() + 1);
    }
    JsonLocation at =
        broken instanceof JsonProcessingException placed ? placed.getLocation() : null;
    return at == null ? Mark.FILE : new Mark(at.getLineNr(), at.getColumnNr());
  }

  private static String whyNotYaml(String text, Mark mark) {
    String line = text.lines().skip(Math.max(0, mark.line() - 1)).findFirst().orElse("");
    String indentation = line.substring(0, line.length() - line.stripLeading().length());
    return indentation.indexOf('\t') >= 0 ? "a tab in the indentation" : "not readable as YAML";
  }

  private static String remedy(boolean json) {
    return json
        ? "check commas, colons, brackets and quotes here and on the line above"
        : "check indentation (by spaces), colons, brackets and quotes here and on the line above";
  }

  private static void alone(Mark mark, String found, String remedy, Faults faults) {
    faults.clear();
    new Spot(mark, "", faults).fault(found, remedy);
  }
}
