package rankfall.identify;

import java.util.List;
import rankfall.exact.AlgebraicNumber;
import rankfall.exact.Polynomial;
import rankfall.lie.LieBracket;
import rankfall.lie.Signature;

/**
 * The names of the real algebras of dimension 0 to 3.
 *
 * <ul>
 *   <li>dimension 0 to 2: {@code 0}, {@code R}, {@code R^2}, {@code aff(1,R)};
 *   <li>abelian, nilpotent, simple: {@code R^3} (Bianchi I), {@code h3} (Bianchi II), {@code
 *       sl(2,R)} (Bianchi VIII), {@code so(3)} (Bianchi IX), the Bianchi type among the other
 *       names;
 *   <li>the others by their type: {@code Bianchi III}, {@code Bianchi IV}, {@code Bianchi V},
 *       {@code Bianchi VI_0}, {@code Bianchi VI_h, h = -4/9}, {@code Bianchi VII_0}, {@code Bianchi
 *       VII_h, h = 1}.
 * </ul>
 *
 * <p>Types: Bianchi 1898; h = a^2/(n2 n3) in the form of Ellis and MacCallum 1969. For a matrix of
 * trace t and determinant d that is a multiple of a on the diagonal and n3, -n2 beside it, t = 2a
 * and d = a^2 + n2 n3, so h = -t^2/(t^2 - 4d) whatever the basis. Type III is VI with h = -1, where
 * d = 0. The classes A_{3,k} of Patera, Sharp, Winternitz and Zassenhaus 1976 are among the other
 * names (table from memory).
 */
public final class Bianchi {
  private Bianchi() {}

  /**
   * The name of a real algebra.
   *
   * @param g real, of dimension 3 at most
   */
  public static TypeName of(ExactAlgebra g) {
    return of(SmallAlgebra.of(LieBracket.of(g.constants())), RealField.of(g));
  }

  static TypeName of(SmallAlgebra<Polynomial> g, RealField field) {
    if (g.dimension() < 2) {
      return TypeName.of(g.dimension() == 0 ? "0" : "R");
    }
    if (g.dimension() == 2) {
      return g.shape() == SmallAlgebra.Shape.ABELIAN
          ? new TypeName("R^2", List.of("2A_1"))
          : new TypeName("aff(1,R)", List.of("A_2"));
    }
    return switch (g.shape()) {
      case ABELIAN -> new TypeName("R^3", List.of("Bianchi I", "3A_1"));
      case HEISENBERG -> new TypeName("h3", List.of("Bianchi II", "Galilei (1+1)", "A_{3,1}"));
      case AFFINE ->
          new TypeName("Bianchi III", List.of("aff(1,R) + R", "Bianchi VI_h, h = -1", "A_2 + A_1"));
      default -> core(g, field);
    };
  }

  /**
   * The name of the part of dimension 3 of an algebra that is it plus a centre.
   *
   * @param g simple or an action on the plane
   */
  static TypeName core(SmallAlgebra<Polynomial> g, RealField field) {
    return switch (g.shape()) {
      case SIMPLE -> simple(Signature.of(List.of(g.data()), field.signs()));
      case PLANE_BLOCK -> new TypeName("Bianchi IV", List.of("A_{3,2}"));
      case PLANE_SCALAR -> new TypeName("Bianchi V", List.of("A_{3,3}"));
      case PLANE_TRACELESS ->
          field.signs().signum(g.data().get(1)) < 0
              ? new TypeName(
                  "Bianchi VI_0",
                  List.of("iso(1,1)", "so(1,1) |x R^2", "Poincare (1+1)", "A_{3,4}"))
              : new TypeName("Bianchi VII_0", List.of("iso(2)", "so(2) |x R^2", "A_{3,6}"));
      case PLANE -> plane(new PlaneMatrix(field, g.data().get(0), g.data().get(1)));
      default -> throw new IllegalArgumentException("not of dimension 3: " + g.shape());
    };
  }

  private static TypeName simple(Signature killing) {
    return killing.plus() == 0
        ? new TypeName("so(3)", List.of("su(2)", "sp(1)", "su*(2)", "Bianchi IX", "A_{3,9}"))
        : new TypeName(
            "sl(2,R)", List.of("so(2,1)", "su(1,1)", "sp(2,R)", "Bianchi VIII", "A_{3,8}"));
  }

  private static TypeName plane(PlaneMatrix m) {
    AlgebraicNumber h = m.h();
    if (m.hasRealEigenvalues()) {
      return new TypeName("Bianchi VI_h, h = " + h, List.of("A_{3,5}, a = " + m.ratio()));
    }
    return new TypeName("Bianchi VII_h, h = " + h, List.of("A_{3,7}, a = " + m.overImaginary()));
  }
}
