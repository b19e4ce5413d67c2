package coilwright.problem;

import java.nio.ByteBuffer;
import java.nio.CharBuffer;
import java.nio.charset.CharsetDecoder;
import java.nio.charset.CoderResult;
import java.nio.charset.CodingErrorAction;
import java.nio.charset.StandardCharsets;
import java.util.Locale;
import java.util.Optional;

/** Turns the bytes of a problem file into text, or says why they are none. */
final class SourceText {

  /** The largest file accepted [bytes]. */
  static final int LARGEST = 1 << 20;

  private static final char BYTE_ORDER_MARK = '\uFEFF';

  private SourceText() {}

  /**
   * Reads the bytes of a file as UTF-8.
   *
   * @param bytes the whole file
   * @param faults takes the fault where it is refused
   * @return the text without its byte-order mark, or empty
   */
  static Optional<String> of(byte[] bytes, Faults faults) {
    if (bytes.length > LARGEST) {
      file(Mark.FILE, faults).fault("larger than 1 MiB", "must be at most " + LARGEST + " bytes");
      return Optional.empty();
    }
    CharsetDecoder decoder =
        StandardCharsets.UTF_8
            .newDecoder()
            .onMalformedInput(CodingErrorAction.REPORT)
            .onUnmappableCharacter(CodingErrorAction.REPORT);
    ByteBuffer in = ByteBuffer.wrap(bytes);
    CharBuffer out = CharBuffer.allocate(bytes.length + 1);
    CoderResult result = decoder.decode(in, out, true);
    String text = out.flip().toString();
    return result.isError() ? malformed(text, in, faults) : clean(withoutMark(text), faults);
  }

  private static Optional<String> malformed(String before, ByteBuffer at, Faults faults) {
    String found =
        String.format(
            Locale.ROOT, "byte 0x%02X at offset %d", at.get(at.position()) & 0xFF, at.position());
    file(markAt(before, before.length()), faults)
        .fault(found + " is not UTF-8", "must be saved as UTF-8 text");
    return Optional.empty();
  }

  private static String withoutMark(String text) {
    return !text.isEmpty() && text.charAt(0) == BYTE_ORDER_MARK ? text.substring(1) : text;
  }

  private static Optional<String> clean(String text, Faults faults) {
    for (int i = 0; i < text.length(); i = text.offsetByCodePoints(i, 1)) {
      int sign = text.codePointAt(i);
      if (!isText(sign)) {
        file(markAt(text, i), faults)
            .fault(
                String.format(Locale.ROOT, "control character U+%04X", sign), "must be left out");
        return Optional.empty();
      }
    }
    return Optional.of(text);
  }

  private static boolean isText(int sign) {
    return sign == '\t'
        || sign == '\n'
        || sign == '\r'
        || sign == 0x85
        || sign >= 0x20 && sign < 0x7F
        || sign >= 0xA0 && sign != 0xFFFE && sign != 0xFFFF;
  }

  private static Mark markAt(String text, int index) {
    int line = 1;
    int start = 0;
    for (int i = 0; i < index; i++) {
      boolean ends = text.charAt(i) == '\n' || text.charAt(i) == '\r' && !isPair(text, i);
      if (ends) {
        line++;
        start = i + 1;
      }
    }
    return new Mark(line, index - start + 1);
  }

  private static boolean isPair(String text, int index) {
    return index + 1 < text.length() && text.charAt(index + 1) == '\n';
  }

  private static Spot file(Mark mark, Faults faults) {
    return new Spot(mark, "", faults);
  }
}
