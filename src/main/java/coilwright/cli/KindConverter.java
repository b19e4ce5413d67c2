package coilwright.cli;

import coilwright.spring.Kind;
import java.util.List;

/** Reads the kind of spring that a starter file is for. */
final class KindConverter extends WordConverter<Kind> {

  KindConverter() {
    super(List.of(Kind.values()), Kind::id);
  }
}
