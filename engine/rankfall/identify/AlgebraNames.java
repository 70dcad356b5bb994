package rankfall.identify;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import rankfall.lie.LieBracket;

/** The name of an algebra at an exact point, by the room that knows its kind. */
public final class AlgebraNames {
  /** Names of Bacry and Levy-Leblond 1968 (from memory) beside those of the structure. */
  private static final Map<String, List<String>> MOTIONS =
      Map.of(
          "so(4,1)", List.of("de Sitter"),
          "so(3,2)", List.of("anti de Sitter"),
          "so(3,1) |x R^4", List.of("Poincare", "para-Poincare"),
          "so(4) |x R^4", List.of("Euclidean"),
          "sl(2,R) |x R^3", List.of("Poincare (2+1)"));

  private AlgebraNames() {}

  /**
   * The name of an algebra.
   *
   * @param g real or complex
   * @return empty if no name is proved
   */
  public static Optional<TypeName> of(ExactAlgebra g) {
    Optional<TypeName> small = small(g);
    if (small.isPresent()) {
      return small;
    }
    TypeName structure = LeviNames.of(g, AlgebraNames::small);
    Optional<TypeName> motion = Kinematical.of(g);
    if (motion.isPresent()) {
      List<String> structures = new ArrayList<>(List.of(structure.name()));
      structures.addAll(structure.otherNames());
      return Optional.of(motion.get().with(structures));
    }
    return Optional.of(
        g.complex()
            ? structure
            : structure.with(MOTIONS.getOrDefault(structure.name(), List.of())));
  }

  /** The name of an algebra of dimension 4 at most; of a complex one, if it has a plain name. */
  private static Optional<TypeName> small(ExactAlgebra g) {
    if (g.dimension() > 4) {
      return Optional.empty();
    }
    if (g.complex()) {
      return complex(g);
    }
    return Optional.of(g.dimension() == 4 ? FourDimensional.of(g) : Bianchi.of(g));
  }

  /** The classes that need neither order nor parameters. */
  private static Optional<TypeName> complex(ExactAlgebra g) {
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
