package coilwright.problem;

import java.util.regex.Pattern;

/** A user's text as messages repeat it: without control characters, and not longer than helps. */
final class ShownText {

  private static final int LONGEST = 60;
  private static final Pattern CONTROLS = Pattern.compile("\\p{Cntrl}+");

  private ShownText() {}

  /**
   * Makes a text fit for a message.
   *
   * @param text as typed
   * @return the text in one line, cut where it is long
   */
  static String of(String text) {
    int cut = Math.min(text.length(), LONGEST);
    if (cut < text.length() && Character.isHighSurrogate(text.charAt(cut - 1))) {
      cut--;
    }
    String shown = CONTROLS.matcher(text.substring(0, cut)).replaceAll(" ");
    return cut < text.length() ? shown + "..." : shown;
  }
}
