package coilwright.search;

import coilwright.material.Catalogue;
import coilwright.material.Wire;
import coilwright.material.WireGrade;
import coilwright.material.WireSeries;
import coilwright.material.WireSize;
import coilwright.problem.Make;
import coilwright.problem.Problem;
import coilwright.source.Evidence;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;

/**
 * The wires that a problem offers: its materials, each in its sizes.
 *
 * @param wires grades drawn to sizes within their data, in the order of materials and sizes
 * @param outsideRange sizes for which their grade has no data
 * @param fromMemory how many sizes of each grade were left out because their data are from memory
 *     and the grade was not named
 */
public record WireChoice(List<Wire> wires, int outsideRange, Map<String, Integer> fromMemory) {

  /** Copies the list. */
  public WireChoice {
    wires = List.copyOf(wires);
  }

  /**
   * Chooses.
   *
   * @param problem the problem
   * @param catalogue the grades and sizes known
   * @return the wires
   */
  public static WireChoice of(Problem problem, Catalogue catalogue) {
    Make make = problem.make();
    boolean named = make.allMaterials() || !make.materials().isEmpty();
    List<Wire> wires = new ArrayList<>();
    Map<String, Integer> fromMemory = new TreeMap<>();
    int outside = 0;
    for (WireGrade grade : grades(problem, catalogue)) {
      boolean own = problem.ownMaterials().contains(grade);
      for (WireSize size : sizes(make, grade, catalogue)) {
        if (!grade.diameters().contains(size.diameter())) {
          outside++;
          continue;
        }
        Wire wire = grade.drawnTo(size);
        if (named || own || wire.evidence() == Evidence.SEEN) {
          wires.add(wire);
        } else {
          fromMemory.merge(grade.id(), 1, Integer::sum);
        }
      }
    }
    return new WireChoice(wires, outside, fromMemory);
  }

  private static List<WireGrade> grades(Problem problem, Catalogue catalogue) {
    Make make = problem.make();
    boolean named = make.allMaterials() || !make.materials().isEmpty();
    List<WireGrade> offered = new ArrayList<>();
    for (String id : named ? catalogue.gradeIds() : catalogue.commonIds(make.supply())) {
      boolean wanted = !named || make.allMaterials() || make.materials().contains(id);
      if (wanted && !make.excludeMaterials().contains(id)) {
        offered.add(catalogue.grade(id));
      }
    }
    for (WireGrade own : problem.ownMaterials()) {
      if (make.allMaterials()
          || make.materials().isEmpty()
          || make.materials().contains(own.id())) {
        offered.add(own);
      }
    }
    offered.removeIf(grade -> make.excludeMaterials().contains(grade.id()));
    return offered;
  }

  private static List<WireSize> sizes(Make make, WireGrade grade, Catalogue catalogue) {
    if (!make.wireSizes().isEmpty()) {
      return make.wireSizes();
    }
    List<WireSize> sizes = new ArrayList<>();
    for (WireSeries series :
        make.wireSeries().isEmpty() ? grade.usualSeries() : make.wireSeries()) {
      sizes.addAll(catalogue.sizes(series));
    }
    return sizes;
  }
}
