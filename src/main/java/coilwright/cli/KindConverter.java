package coilwright.cli;

import java.util.List;

/** Reads the kind of spring that a starter file is for. */
final class KindConverter extends WordConverter<String> {

  KindConverter() {
    super(List.of("compression"), word -> word, "extension", "torsion");
  }
}
