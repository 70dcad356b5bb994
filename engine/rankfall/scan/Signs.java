package rankfall.scan;

/** The signs of numbered polynomials at one point. */
@FunctionalInterface
interface Signs {
  /** The exact sign, -1, 0 or 1. */
  int sign(int polynomial);
}
