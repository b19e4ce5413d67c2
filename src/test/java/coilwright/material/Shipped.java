package coilwright.material;

/** The catalogue's own files, as text, for tests that change them. */
final class Shipped {

  private Shipped() {}

  /** A catalogue in which one file has a piece of its text replaced. */
  static Catalogue with(String file, String piece, String replacement) {
    if (!Catalogue.shipped(file).contains(piece)) {
      throw new IllegalArgumentException(file + " does not contain " + piece);
    }
    return new Catalogue(
        name ->
            name.equals(file)
                ? Catalogue.shipped(name).replace(piece, replacement)
                : Catalogue.shipped(name));
  }
}
