package rankfall.report;

import java.util.Optional;

/** The Greek letters, as characters and by their English names. */
enum GreekLetters {
  ALPHA("\u03b1", "\\alpha"),
  BETA("\u03b2", "\\beta"),
  GAMMA("\u03b3", "\\gamma"),
  DELTA("\u03b4", "\\delta"),
  EPSILON("\u03b5", "\\varepsilon"),
  ZETA("\u03b6", "\\zeta"),
  ETA("\u03b7", "\\eta"),
  THETA("\u03b8", "\\theta"),
  IOTA("\u03b9", "\\iota"),
  KAPPA("\u03ba", "\\kappa"),
  LAMBDA("\u03bb", "\\lambda"),
  MU("\u03bc", "\\mu"),
  NU("\u03bd", "\\nu"),
  XI("\u03be", "\\xi"),
  OMICRON("\u03bf", "o"),
  PI("\u03c0", "\\pi"),
  RHO("\u03c1", "\\rho"),
  SIGMA("\u03c3", "\\sigma"),
  TAU("\u03c4", "\\tau"),
  UPSILON("\u03c5", "\\upsilon"),
  PHI("\u03c6", "\\varphi"),
  CHI("\u03c7", "\\chi"),
  PSI("\u03c8", "\\psi"),
  OMEGA("\u03c9", "\\omega");

  private static final String CAPITALS_OF_THEIR_OWN =
      "\u0393\u0394\u0398\u039b\u039e\u03a0\u03a3\u03a5\u03a6\u03a8\u03a9";

  private final String small;
  private final String latex;

  GreekLetters(String small, String latex) {
    this.small = small;
    this.latex = latex;
  }

  private String capital() {
    return small.toUpperCase(java.util.Locale.ROOT);
  }

  private String english() {
    return name().toLowerCase(java.util.Locale.ROOT);
  }

  private String capitalised() {
    return name().charAt(0) + english().substring(1);
  }

  private Formula.Letter smallLetter() {
    return new Formula.Letter(small, latex);
  }

  private Formula.Letter capitalLetter() {
    boolean own = CAPITALS_OF_THEIR_OWN.contains(capital());
    String plain = this == PHI ? "\\Phi" : "\\" + capitalised();
    return new Formula.Letter(capital(), own ? plain : "\\mathrm{" + latinTwin() + "}");
  }

  /** The Latin letter that looks like the capital. */
  private String latinTwin() {
    return switch (this) {
      case ETA -> "H";
      case NU -> "N";
      case RHO -> "P";
      case CHI -> "X";
      default -> name().substring(0, 1);
    };
  }

  /**
   * The letter that a name stands for: a Greek character, or the English name of a letter; a
   * capital by name only where it differs from the Latin letters.
   */
  static Optional<Formula.Letter> named(String name) {
    for (GreekLetters g : values()) {
      if (name.equals(g.small) || name.equals(g.english())) {
        return Optional.of(g.smallLetter());
      }
      if (name.equals(g.capital())
          || (name.equals(g.capitalised()) && CAPITALS_OF_THEIR_OWN.contains(g.capital()))) {
        return Optional.of(g.capitalLetter());
      }
    }
    return variant(name);
  }

  private static Optional<Formula.Letter> variant(String name) {
    return switch (name) {
      case "\u03d1" -> Optional.of(new Formula.Letter(name, "\\vartheta"));
      case "\u03d5" -> Optional.of(new Formula.Letter(name, "\\phi"));
      case "\u03d6" -> Optional.of(new Formula.Letter(name, "\\varpi"));
      case "\u03f1" -> Optional.of(new Formula.Letter(name, "\\varrho"));
      case "\u03c2" -> Optional.of(new Formula.Letter(name, "\\varsigma"));
      case "\u03f5" -> Optional.of(new Formula.Letter(name, "\\epsilon"));
      default -> Optional.empty();
    };
  }
}
