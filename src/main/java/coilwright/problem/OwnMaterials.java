package coilwright.problem;

import coilwright.material.Catalogue;
import coilwright.material.WireGrade;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;

/** Reads the grades that a file defines, in file order: each may be like one before it. */
final class OwnMaterials {

  private final Catalogue catalogue;
  private final MaterialIds ids;
  private final UnitSystem units;
  private final Map<String, WireGrade> own = new HashMap<>();
  private final Set<String> defined = new HashSet<>();

  /**
   * A reader.
   *
   * @param catalogue the grades there are
   * @param ids their ids; those of the own grades are added
   * @param units decide the usual wire series of a grade that is like no other
   */
  OwnMaterials(Catalogue catalogue, MaterialIds ids, UnitSystem units) {
    this.catalogue = catalogue;
    this.ids = ids;
    this.units = units;
  }

  /**
   * Reads the grades.
   *
   * @param root the file
   * @return those without fault
   */
  List<WireGrade> read(Section root) {
    List<WireGrade> grades = new ArrayList<>();
    List<Section> sections = root.read(MaterialKeys.OWN_MATERIALS).orElse(List.of());
    sections.stream()
        .filter(section -> section.has(MaterialKeys.ID))
        .forEach(section -> defined.add(section.shown(MaterialKeys.ID)));
    for (Section section : sections) {
      grade(section).ifPresent(grades::add);
    }
    return grades;
  }

  private Optional<WireGrade> grade(Section section) {
    long before = section.spot().faults().count();
    Optional<String> id = section.require(MaterialKeys.ID);
    Optional<String> likeId = section.read(MaterialKeys.LIKE);
    likeId.ifPresent(other -> checkLike(other, section.spot(MaterialKeys.LIKE)));
    if (id.isPresent() && !ids.add(id.get())) {
      section
          .spot(MaterialKeys.ID)
          .fault(section.shown(MaterialKeys.ID), "must be new; a grade has this id already");
    }
    boolean faulty = section.spot().faults().count() > before;
    Optional<WireGrade> like = faulty ? Optional.empty() : likeId.flatMap(this::known);
    boolean alone = !section.has(MaterialKeys.LIKE);
    Optional<WireGrade> grade =
        new OwnGrade(section, like, alone, catalogue, units).read(id.orElse("-"));
    if (section.spot().faults().count() > before) {
      return Optional.empty();
    }
    grade.ifPresent(read -> own.put(read.id(), read));
    return grade;
  }

  private void checkLike(String id, Spot spot) {
    if (defined.contains(id) && !ids.knows(id)) {
      spot.fault(
          ShownText.of(id) + ", an own grade that is not defined yet", "must be one defined above");
    } else {
      ids.check(id, spot);
    }
  }

  private Optional<WireGrade> known(String id) {
    if (own.containsKey(id)) {
      return Optional.of(own.get(id));
    }
    return catalogue.gradeIds().contains(id) ? Optional.of(catalogue.grade(id)) : Optional.empty();
  }
}
