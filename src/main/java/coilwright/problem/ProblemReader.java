package coilwright.problem;

import coilwright.material.Catalogue;
import coilwright.material.WireGrade;
import coilwright.spring.Kind;
import coilwright.spring.Seating;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;

/** Reads problem files. */
public final class ProblemReader {

  private static final int TOP = 10;

  private final Section root;
  private final Purpose purpose;
  private final Catalogue catalogue;

  private ProblemReader(Section root, Purpose purpose, Catalogue catalogue) {
    this.root = root;
    this.purpose = purpose;
    this.catalogue = catalogue;
  }

  /**
   * Reads a problem file. What is wrong with it is reported, never thrown.
   *
   * @param bytes the whole file: YAML, or JSON where its first sign is an opening brace; UTF-8
   * @param purpose what it is read for
   * @param catalogue the grades it may name
   * @return the problem, or every fault in the file
   */
  public static Reading read(byte[] bytes, Purpose purpose, Catalogue catalogue) {
    Faults faults = new Faults();
    Optional<Problem> problem =
        SourceText.of(bytes, faults)
            .flatMap(text -> Document.read(text, faults))
            .flatMap(node -> root(node, faults))
            .flatMap(root -> new ProblemReader(root, purpose, catalogue).problem());
    return new Reading(faults.count() == 0 ? problem : Optional.empty(), faults.list());
  }

  private static Optional<Section> root(Node node, Faults faults) {
    Spot file = new Spot(node.mark(), "", faults);
    if (node.isEmpty()) {
      file.fault("empty", "must be " + SectionReader.accepted(""));
      return Optional.empty();
    }
    return Section.open(node, file);
  }

  private Optional<Problem> problem() {
    Optional<String> title = root.read(HeadKeys.TITLE);
    root.require(HeadKeys.SPRING);
    UnitSystem units = root.read(HeadKeys.UNITS).orElse(UnitSystem.METRIC);
    checkPurpose();
    LoadsRead loads = LoadsRead.of(root, root.has(DesignKeys.DESIGN) ? Purpose.CHECK : purpose);
    OptionalDouble overtravel = OvertravelReader.read(root, loads);
    Envelope envelope = EnvelopeReader.read(root);
    Optional<Seating> seats = root.read(EnvelopeKeys.SEATS);
    MaterialIds ids = new MaterialIds(catalogue);
    List<WireGrade> own = new OwnMaterials(catalogue, ids, units).read(root);
    DesignLimits limits = LimitsReader.read(root);
    Make make = new MakeReader(ids, units, limits.method()).read(root);
    Optional<CompressionDesign> design =
        root.read(DesignKeys.DESIGN)
            .flatMap(section -> new DesignReader(ids, section, limits.method()).read());
    design.ifPresent(loads::checkAgainst);

    if (purpose == Purpose.SHORTLIST && root.spot().faults().count() == 0) {
      CoilStepRule.check(root, make.coilStep(), limits.activeCoils().max());
    }
    Optional<Section> rank = root.read(RankKeys.RANK);
    RankBy by = rank.flatMap(section -> section.read(RankKeys.BY)).orElse(RankBy.MASS);
    int top = rank.flatMap(section -> section.read(RankKeys.TOP)).orElse(TOP);
    return Optional.of(
        new Problem(
            title.orElse(""),
            Kind.COMPRESSION,
            units,
            loads.facts(),
            loads.required(),
            overtravel,
            envelope,
            seats,
            make,
            design.map(Design.class::cast),
            limits,
            Optional.empty(),
            Optional.empty(),
            own,
            by,
            top));
  }

  private void checkPurpose() {
    boolean design = root.has(DesignKeys.DESIGN);
    if (design && root.has(MakeKeys.MAKE)) {
      root.spot(DesignKeys.DESIGN)
          .fault("given beside make", "must be only one: make for shortlist, design for check");
    } else if (design && purpose == Purpose.SHORTLIST) {
      root.spot(DesignKeys.DESIGN)
          .fault("a design block", "must be left out for shortlist; check judges it");
    } else if (!design && purpose == Purpose.CHECK) {
      root.spot(DesignKeys.DESIGN)
          .fault("missing", "must describe the spring to check; shortlist needs none");
    }
  }
}
