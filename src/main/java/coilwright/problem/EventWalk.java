package coilwright.problem;

import com.fasterxml.jackson.core.JsonLocation;
import com.fasterxml.jackson.core.JsonParser;
import com.fasterxml.jackson.core.JsonToken;
import java.io.IOException;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;

/**
 * Walks once over the events of a parser and builds nodes of them. Repeated keys, anchors, aliases,
 * tags and a second document become faults, and the walk goes on.
 */
final class EventWalk {

  private static final int DEEPEST = 16;

  private final JsonParser parser;

  /** The text by code points, as YAML events count it; empty for JSON, which has no such signs. */
  private final int[] signs;

  /**
   * A walk over a text.
   *
   * @param parser at its beginning
   * @param signs the text's code points for YAML; empty for JSON
   */
  EventWalk(JsonParser parser, int[] signs) {
    this.parser = parser;
    this.signs = signs;
  }

  /**
   * Walks over the whole text.
   *
   * @param faults takes what is refused on the way
   * @return the document; an empty scalar where there is none
   * @throws IOException where the text is not YAML or JSON
   * @throws TooDeep where it is nested deeper than any problem
   */
  Node document(Faults faults) throws IOException, TooDeep {
    if (parser.nextToken() == null) {
      return new Node.Scalar(Mark.FILE, "");
    }
    Node root = value(new Spot(mark(), "", faults), 0);
    if (parser.nextToken() != null) {
      Spot second = new Spot(mark(), "", faults);
      second.fault("a second document begins", "must hold one document");
    }
    return root;
  }

  private Node value(Spot spot, int depth) throws IOException, TooDeep {
    if (depth > DEEPEST) {
      throw new TooDeep(spot.mark());
    }
    Mark mark = mark();
    if (refusesAlias(spot)) {
      return new Node.Refused(mark);
    }
    if (parser.currentToken() == JsonToken.START_OBJECT) {
      return mapping(mark, spot, depth);
    }
    return parser.currentToken() == JsonToken.START_ARRAY
        ? sequence(mark, spot, depth)
        : new Node.Scalar(mark, parser.getText());
  }

  private Node mapping(Mark mark, Spot spot, int depth) throws IOException, TooDeep {
    Map<String, Node.Entry> entries = new LinkedHashMap<>();
    while (parser.nextToken() != JsonToken.END_OBJECT) {
      String key = parser.currentName();
      Mark at = mark();
      Spot place = spot.key(at, key);
      refusesAlias(place);
      parser.nextToken();
      Node.Entry entry = new Node.Entry(at, key, value(place, depth + 1));
      Node.Entry earlier = entries.putIfAbsent(key, entry);
      if (earlier != null) {
        place.fault("repeated key", "must stand once; it stands on line " + earlier.mark().line());
      }
    }
    return new Node.Mapping(mark, List.copyOf(entries.values()));
  }

  private Node sequence(Mark mark, Spot spot, int depth) throws IOException, TooDeep {
    List<Node> items = new ArrayList<>();
    while (parser.nextToken() != JsonToken.END_ARRAY) {
      items.add(value(spot.item(mark(), items.size()), depth + 1));
    }
    return new Node.Sequence(mark, items);
  }

  /** Reports an anchor or a tag, and goes on; reports an alias, and returns true. */
  private boolean refusesAlias(Spot spot) {
    int sign = firstSign();
    if (sign == '&') {
      spot.fault("an anchor (&)", "must be left out");
    } else if (sign == '!') {
      spot.fault("a tag (!)", "must be left out");
    } else if (sign == '*') {
      spot.fault("an alias (*)", "must be written out");
    }
    return sign == '*';
  }

  /** The first sign of the current token; blank where the token takes no room. */
  private int firstSign() {
    long from = parser.currentTokenLocation().getCharOffset();
    long to = parser.currentLocation().getCharOffset();
    return from >= 0 && from < to && from < signs.length ? signs[(int) from] : ' ';
  }

  private Mark mark() {
    JsonLocation location = parser.currentTokenLocation();
    return new Mark(location.getLineNr(), location.getColumnNr());
  }

  /** The text is nested deeper than any problem. */
  static final class TooDeep extends Exception {

    private static final long serialVersionUID = 1;

    private final transient Mark mark;

    TooDeep(Mark mark) {
      super("nested too deep", null, false, false);
      this.mark = mark;
    }

    /** Where it becomes too deep. */
    Mark mark() {
      return mark;
    }
  }
}
