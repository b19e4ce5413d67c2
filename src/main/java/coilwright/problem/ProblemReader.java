package coilwright.problem;

import coilwright.material.Catalogue;
import coilwright.material.WireGrade;
import coilwright.spring.Method;
import java.util.List;
import java.util.Optional;

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
    Spot file = new Spot(node.mark(), "", faults).of(KindPeek.of(node));
    if (node.isEmpty()) {
      file.fault("empty", "must be " + SectionReader.accepted(file.kind(), ""));
      return Optional.empty();
    }
    return Section.open(node, file);
  }

  private Optional<Problem> problem() {
    Optional<String> title = root.read(HeadKeys.TITLE);
    root.require(HeadKeys.SPRING);
    UnitSystem units = root.read(HeadKeys.UNITS).orElse(UnitSystem.METRIC);
    checkPurpose();
    Blocks blocks = Blocks.of(root, purpose);
    Envelope envelope = EnvelopeReader.read(blocks.envelope());
    MaterialIds ids = new MaterialIds(catalogue);
    List<WireGrade> own = new OwnMaterials(catalogue, ids, units).read(root);
    DesignLimits limits = LimitsReader.read(blocks.limits(), blocks.kind());
    Make make = new MakeReader(ids, units, limits.method(), blocks.kind()).read(blocks.make());
    KindPart part = part(blocks, ids, limits.method());
    if (purpose == Purpose.SHORTLIST && blocks.faults() == 0) {
      CoilStepRule.check(blocks, make.coilStep(), limits.activeCoils().max());
    }
    Optional<Section> rank = root.read(RankKeys.RANK);
    RankBy by = rank.flatMap(section -> section.read(RankKeys.BY)).orElse(RankBy.MASS);
    int top = rank.flatMap(section -> section.read(RankKeys.TOP)).orElse(TOP);
    return Optional.of(
        new Problem(
            title.orElse(""),
            blocks.kind(),
            units,
            part.facts(),
            part.required(),
            part.overtravel(),
            envelope,
            part.seats(),
            make,
            part.design(),
            limits,
            part.extension(),
            part.torsion(),
            own,
            by,
            top));
  }

  private static KindPart part(Blocks blocks, MaterialIds ids, Method method) {
    return switch (blocks.kind()) {
      case COMPRESSION -> new CompressionReader(blocks, ids, method).read();
      case EXTENSION -> new ExtensionReader(blocks, ids).read();
      case TORSION -> new TorsionReader(blocks, ids, method).read();
    };
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
