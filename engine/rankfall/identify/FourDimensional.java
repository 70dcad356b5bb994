package rankfall.identify;

import java.math.BigInteger;
import java.util.ArrayList;
import java.util.List;
import org.apache.commons.numbers.fraction.BigFraction;
import rankfall.exact.AlgebraicNumber;
import rankfall.exact.Polynomial;
import rankfall.lie.LieBracket;

/**
 * The names of the real algebras of dimension 4: the classes A_{4,1} to A_{4,12} of Patera, Sharp,
 * Winternitz and Zassenhaus, J. Math. Phys. 17 (1976) 986, table I, with parameters in their normal
 * range (from memory), and the decomposable ones as sums.
 *
 * <p>With [x, e4] for x in the nilradical, the matrices are
 *
 * <ul>
 *   <li>A_{4,2}: a, and a block of size 2 for 1; a not 0. A_{4,4}: a block of size 3 for 1;
 *   <li>A_{4,5}: 1, a, b with -1 &lt;= a &lt;= b &lt;= 1, not 0, and b positive if a = -1;
 *   <li>A_{4,6}: a, and b + i, b - i; a not 0, b &gt;= 0, and a positive if b = 0;
 *   <li>on h3: A_{4,7}: a block of size 2 for 1 modulo the centre; A_{4,8}: 1 and -1; A_{4,9}: 1
 *       and b, -1 &lt; b &lt;= 1; A_{4,10}: i and -i; A_{4,11}: a + i and a - i, a &gt; 0.
 * </ul>
 */
public final class FourDimensional {
  private FourDimensional() {}

  /**
   * The name of a real algebra.
   *
   * @param g real, of dimension 4
   */
  public static TypeName of(ExactAlgebra g) {
    if (g.dimension() != 4) {
      throw new IllegalArgumentException("dimension " + g.dimension());
    }
    return of(SmallAlgebra.of(LieBracket.of(g.constants())), RealField.of(g));
  }

  static TypeName of(SmallAlgebra<Polynomial> g, RealField field) {
    return switch (g.shape()) {
      case ABELIAN -> new TypeName("R^4", List.of("4A_1"));
      case AFFINE -> new TypeName("aff(1,R) + R^2", List.of("Bianchi III + R", "A_2 + 2A_1"));
      case HEISENBERG -> new TypeName("h3 + R", List.of("Bianchi II + R", "A_{3,1} + A_1"));
      case SIMPLE, PLANE_SCALAR, PLANE_BLOCK, PLANE_TRACELESS, PLANE ->
          plusLine(Bianchi.core(g, field));
      case FILIFORM -> TypeName.of("A_{4,1}");
      case PAIR ->
          field.signs().signum(g.data().get(0)) > 0
              ? new TypeName("aff(1,R) + aff(1,R)", List.of("2A_2"))
              : new TypeName("A_{4,12}", List.of("aff(1,C)_R"));
      case SPACE_SINGULAR -> TypeName.of("A_{4,3}");
      case SPACE_SCALAR -> TypeName.of("A_{4,5}, a = 1, b = 1");
      case SPACE_TRIPLE -> TypeName.of("A_{4,2}, a = 1");
      case SPACE_BLOCK -> TypeName.of("A_{4,4}");
      case SPACE_DOUBLE_BLOCK -> TypeName.of("A_{4,2}, a = " + simpleOverDouble(g, field));
      case SPACE_DOUBLE -> TypeName.of("A_{4,5}, " + diagonal(g, field));
      case SPACE -> TypeName.of(space(new CubicRoots(field, g.data())));
      case SYMPLECTIC_SCALAR -> TypeName.of("A_{4,9}, b = 1");
      case SYMPLECTIC_BLOCK -> TypeName.of("A_{4,7}");
      case SYMPLECTIC_TRACELESS ->
          field.signs().signum(g.data().get(1)) < 0
              ? TypeName.of("A_{4,8}")
              : new TypeName("A_{4,10}", List.of("oscillator algebra", "diamond algebra"));
      case SYMPLECTIC -> symplectic(new PlaneMatrix(field, g.data().get(0), g.data().get(1)));
    };
  }

  private static TypeName plusLine(TypeName part) {
    List<String> others = new ArrayList<>();
    switch (part.name()) {
      case "so(3)" -> others.add("u(2)");
      case "sl(2,R)" -> others.addAll(List.of("gl(2,R)", "u(1,1)"));
      default -> {}
    }
    part.otherNames().forEach(n -> others.add(plus(n)));
    return new TypeName(plus(part.name()), others);
  }

  /** The parameter stays at the end. */
  private static String plus(String name) {
    int comma = name.indexOf(", ");
    String head = comma < 0 ? name : name.substring(0, comma);
    String line = head.startsWith("A_") ? " + A_1" : " + R";
    return (head.contains("|x") ? "(" + head + ")" : head)
        + line
        + (comma < 0 ? "" : name.substring(comma));
  }

  /** The simple eigenvalue over the double one, which is (c1 c2 - 9 c3) over 2 (c1^2 - 3 c2). */
  private static AlgebraicNumber simpleOverDouble(SmallAlgebra<Polynomial> g, RealField field) {
    List<Polynomial> q = ratio(g);
    return field.quotient(q.get(0), q.get(1));
  }

  private static AlgebraicNumber doubleOverSimple(SmallAlgebra<Polynomial> g, RealField field) {
    List<Polynomial> q = ratio(g);
    return field.quotient(q.get(1), q.get(0));
  }

  /**
   * The simple eigenvalue over the double one.
   *
   * @return numerator and denominator
   */
  static List<Polynomial> ratio(SmallAlgebra<Polynomial> g) {
    Polynomial c1 = g.data().get(0);
    Polynomial c2 = g.data().get(1);
    Polynomial c3 = g.data().get(2);
    Polynomial apart = c1.pow(2).minus(times(3, c2));
    Polynomial below = c1.times(c2).minus(times(9, c3));
    return List.of(times(2, c1.times(apart).minus(below)), below);
  }

  private static Polynomial times(int k, Polynomial p) {
    return p.times(BigInteger.valueOf(k));
  }

  private static String diagonal(SmallAlgebra<Polynomial> g, RealField field) {
    AlgebraicNumber a = simpleOverDouble(g, field);
    boolean doubleIsLarger =
        a.compareTo(BigFraction.ONE) <= 0 && a.compareTo(BigFraction.of(-1)) >= 0;
    if (doubleIsLarger) {
      return "a = " + a + ", b = 1";
    }
    AlgebraicNumber b = doubleOverSimple(g, field);
    return "a = " + b + ", b = " + b;
  }

  private static String space(CubicRoots roots) {
    boolean real = roots.allReal();
    CubicRoots.Ratios r = real ? roots.real() : roots.complex();
    return (real ? "A_{4,5}" : "A_{4,6}") + ", a = " + r.a() + ", b = " + r.b();
  }

  private static TypeName symplectic(PlaneMatrix m) {
    return TypeName.of(
        m.hasRealEigenvalues()
            ? "A_{4,9}, b = " + m.ratio()
            : "A_{4,11}, a = " + m.overImaginary());
  }
}
