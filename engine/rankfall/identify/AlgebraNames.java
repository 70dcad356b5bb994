package rankfall.identify;

import java.util.List;
import java.util.Map;
import java.util.Optional;
import rankfall.lie.LieBracket;

/** The name of an algebra at an exact point, by the room that knows its kind. */
public final class AlgebraNames {
  /** Names of Bacry and Levy-Leblond 1968 (from memory) beside those of their structure. */
  private static final Map<String, List<String>> KINEMATICAL =
      Map.of(
          "so(4,1)", List.of("de Sitter"),
          "so(3,2)", List.of("anti de Sitter"));

  private AlgebraNames() {}

  /**
   * The name of an algebra.
   *
   * @param g real or complex
   * @return empty if no name is proved
   */
  public static Optional<TypeName> of(ExactAlgebra g) {
    if (g.complex()) {
      return complex(g);
    }
    if (g.dimension() < 4) {
      return Optional.of(Bianchi.of(g));
    }
    if (g.dimension() == 4) {
      return Optional.of(FourDimensional.of(g));
    }
    return Kinematical.of(g);
  }

  /** The classes that need neither order nor parameters. */
  private static Optional<TypeName> complex(ExactAlgebra g) {
    if (g.dimension() > 4) {
      return Optional.empty();
    }
    return switch (SmallAlgebra.of(LieBracket.of(g.constants())).shape()) {
      case ABELIAN -> Optional.of(TypeName.of(power(g.dimension())));
      case AFFINE -> Optional.of(plus("aff(1,C)", g.dimension() - 2));
      case HEISENBERG -> Optional.of(plus("h3 over C", g.dimension() - 3));
      case SIMPLE -> Optional.of(plus("sl(2,C)", g.dimension() - 3));
      default -> Optional.empty();
    };
  }

  private static TypeName plus(String name, int centre) {
    return TypeName.of(centre == 0 ? name : name + " + " + power(centre));
  }

  private static String power(int n) {
    return n == 0 ? "0" : n == 1 ? "C" : "C^" + n;
  }
}
