package coilwright.cli;

import java.util.Locale;

/**
 * Text that cannot steer a terminal. A user's title or file name may hold control characters (C0,
 * delete, C1); none of them leaves the program as such.
 */
final class PlainText {

  private PlainText() {}

  /** Text for people: a space for every control character but the line feed. */
  static String of(String text) {
    return replaced(text, true, false);
  }

  /** Text for people in one line: a space for every control character. */
  static String line(String text) {
    return replaced(text, false, false);
  }

  /** JSON: an escape for every control character but the line feed between its parts. */
  static String json(String document) {
    return replaced(document, true, true);
  }

  private static String replaced(String text, boolean lines, boolean escaped) {
    StringBuilder plain = new StringBuilder(text.length());
    for (int i = 0; i < text.length(); i++) {
      char sign = text.charAt(i);
      if (!Character.isISOControl(sign) || lines && sign == '\n') {
        plain.append(sign);
      } else {
        plain.append(escaped ? String.format(Locale.ROOT, "\\u%04x", (int) sign) : " ");
      }
    }
    return plain.toString();
  }
}
