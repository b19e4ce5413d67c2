package coilwright.source;

/** The publications this project relies on. */
public enum Source {
  /** Music spring wire. */
  ASTM_A228("ASTM A228", "ASTM A228/A228M, Steel Wire, Music Spring Quality"),
  /** Cold-drawn mechanical spring wire. */
  ASTM_A227("ASTM A227", "ASTM A227/A227M, Steel Wire, Cold-Drawn for Mechanical Springs"),
  /** Quenched and tempered spring wire. */
  ASTM_A229(
      "ASTM A229", "ASTM A229/A229M, Steel Wire, Quenched and Tempered for Mechanical Springs"),
  /** Quenched and tempered chrome-vanadium spring wire. */
  ASTM_A231("ASTM A231", "ASTM A231/A231M, Chromium-Vanadium Alloy Steel Spring Wire"),
  /** Quenched and tempered chrome-silicon spring wire. */
  ASTM_A401("ASTM A401", "ASTM A401/A401M, Steel Wire, Chromium-Silicon Alloy"),
  /** Stainless spring wire. */
  ASTM_A313("ASTM A313", "ASTM A313/A313M, Stainless Steel Spring Wire"),
  /** Phosphor bronze wire. */
  ASTM_B159("ASTM B159", "ASTM B159/B159M, Phosphor Bronze Wire"),
  /** Beryllium copper wire. */
  ASTM_B197("ASTM B197", "ASTM B197/B197M, Copper-Beryllium Alloy Wire"),
  /** Patented cold-drawn unalloyed spring wire. */
  EN_10270_1(
      "EN 10270-1",
      "EN 10270-1, Steel wire for mechanical springs, part 1: patented cold drawn unalloyed"),
  /** Oil-hardened and tempered spring wire. */
  EN_10270_2(
      "EN 10270-2",
      "EN 10270-2, Steel wire for mechanical springs, part 2: oil hardened and tempered"),
  /** Stainless spring wire. */
  EN_10270_3("EN 10270-3", "EN 10270-3, Steel wire for mechanical springs, part 3: stainless"),
  /** Wire dimensions and tolerances. */
  EN_10218_2(
      "EN 10218-2",
      "EN 10218-2, Steel wire and wire products, part 2: wire dimensions and tolerances"),
  /** Quality of cold-coiled compression springs. */
  EN_15800(
      "EN 15800",
      "EN 15800, Cylindrical helical springs made of round wire, quality specifications for cold coiled compression springs"),
  /** Compression springs, calculation and design. */
  EN_13906_1(
      "EN 13906-1",
      "EN 13906-1, Cylindrical helical springs made from round wire and bar, part 1: compression springs"),
  /** Extension springs, calculation and design. */
  EN_13906_2(
      "EN 13906-2",
      "EN 13906-2, Cylindrical helical springs made from round wire and bar, part 2: extension springs"),
  /** Torsion springs, calculation and design. */
  EN_13906_3(
      "EN 13906-3",
      "EN 13906-3, Cylindrical helical springs made from round wire and bar, part 3: torsion springs"),
  /** The textbook by Shigley and its later editors. */
  SHIGLEY("Shigley", "Shigley's Mechanical Engineering Design, chapter 10 (8th to 11th edition)"),
  /** The handbook of machine design. */
  STANDARD_HANDBOOK(
      "Standard Handbook of Machine Design", "Standard Handbook of Machine Design, springs"),
  /** The textbook by Norton. */
  NORTON("Norton", "Norton, Machine Design, chapter 14"),
  /** The textbook by Mott. */
  MOTT("Mott", "Mott, Machine Elements in Mechanical Design, chapter 19 (4th edition)"),
  /** The handbook of the machine trades. */
  MACHINERYS_HANDBOOK("Machinery's Handbook", "Machinery's Handbook, 31st edition, springs"),
  /** The textbook by Bhandari. */
  BHANDARI("Bhandari", "Bhandari, Design of Machine Elements, chapter 10"),
  /** The monograph on mechanical springs. */
  WAHL("Wahl", "Wahl, Mechanical Springs, 2nd edition, 1963"),
  /** The paper on the stability of compression springs. */
  HARINGX(
      "Haringx",
      "Haringx, On highly compressible helical springs and rubber rods, Philips Research Reports 3-4, 1948-1949"),
  /** The discrete optimisation benchmark. */
  SANDGREN_1990(
      "Sandgren 1990",
      "Sandgren, Nonlinear integer and discrete programming in mechanical design optimization, J. Mech. Des. 112, 1990"),
  /** What wire mills, distributors and gauge makers print about their wire. */
  TRADE_TABLES(
      "trade tables",
      "Tables of gauges and properties printed by wire mills and wire distributors"),
  /** Geometry or mechanics that follows from first principles. */
  FIRST_PRINCIPLES("first principles", "Geometry and statics; no publication needed"),
  /** What the trade does without a citable page. */
  COMMON_PRACTICE("common practice, no source", "Common practice in the spring trade, no source"),
  /** What the problem file itself asks. */
  PROBLEM_FILE("problem file", "The problem file");

  private final String shortTitle;
  private final String title;

  Source(String shortTitle, String title) {
    this.shortTitle = shortTitle;
    this.title = title;
  }

  /** The name used in one-line citations. */
  public String shortTitle() {
    return shortTitle;
  }

  /** The full title. */
  public String title() {
    return title;
  }
}
