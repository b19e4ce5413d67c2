package coilwright.material;

/** How a wire came by its strength: handbooks give static allowables by these classes. */
public enum AllowableClass {
  /** Patented or otherwise hardened by drawing, carbon steel. */
  COLD_DRAWN_CARBON("cold-drawn carbon steel"),
  /** Hardened and tempered carbon or low alloy steel. */
  HARDENED_TEMPERED("hardened and tempered carbon or low alloy steel"),
  /** Austenitic stainless steel. */
  AUSTENITIC_STAINLESS("austenitic stainless steel"),
  /** Copper and nickel alloys. */
  NON_FERROUS("non-ferrous alloy");

  private final String words;

  AllowableClass(String words) {
    this.words = words;
  }

  /** The class in words. */
  public String words() {
    return words;
  }
}
