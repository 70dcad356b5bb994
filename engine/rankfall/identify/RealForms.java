package rankfall.identify;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import rankfall.identify.SimpleType.Series;

/**
 * The simple real Lie algebras by complex type and character.
 *
 * <p>The character is dim p - dim k of the Cartan decomposition (Helgason, Differential Geometry,
 * Lie Groups, and Symmetric Spaces, 1978, chapter X, section 6.2, table V). For N the order of the
 * complex matrices: {@code su(p,q)} 1 - (p-q)^2, {@code sl(N,R)} N - 1, {@code su*(N)} -N - 1,
 * {@code so(p,q)} (N - (p-q)^2)/2, {@code so*(N)} -N/2, {@code sp(N,R)} N/2, {@code sp(p,q)}
 * -2(p-q)^2 - N/2.
 *
 * <p>Which name of isomorphic algebras (Helgason, chapter X, section 6.4) is preferred, is common
 * practice without a source: {@code so(3)}, {@code sl(2,R)}, {@code so(3,1)} of type A_1; {@code
 * so(5)}, {@code so(4,1)}, {@code so(3,2)} of type B_2; {@code su(4)}, {@code su(3,1)}, {@code
 * so(4,2)}, {@code so(5,1)}, {@code sl(4,R)} of type A_3; {@code so(6,2)} before {@code so*(8)}.
 * Two ideals of dimension 3 are {@code so(4)}, {@code so(2,2)} or {@code so(3) + sl(2,R)}. In
 * {@code sp(2n,R)} and {@code sp(2n,C)} stands the order of the matrices, in {@code sp(n)} and
 * {@code sp(p,q)} the quaternionic one.
 */
public final class RealForms {
  /** The real forms whose character a formula does not give; the name holds it. */
  private static final Map<String, List<Integer>> EXCEPTIONAL =
      Map.of(
          "E6", List.of(-78, -26, -14, 2, 6),
          "E7", List.of(-133, -25, -5, 7),
          "E8", List.of(-248, -24, 8),
          "F4", List.of(-52, -20, 4),
          "G2", List.of(-14, 2));

  private RealForms() {}

  /**
   * The real forms of a type.
   *
   * @return each algebra once, ascending by character; the compact one is first
   */
  public static List<RealForm> of(SimpleType type) {
    List<RealForm> out = new ArrayList<>();
    int n = type.rank();
    switch (type.series()) {
      case A -> linear(type, out);
      case B -> {
        for (int q = 0; q <= n; q++) {
          out.add(orthogonal(type, 2 * n + 1 - q, q));
        }
      }
      case C -> {
        for (int q = 0; q <= n / 2; q++) {
          out.add(form(type, sp(n - q, q), characterOfSp(n - q, q)));
        }
        out.add(form(type, "sp(" + 2 * n + ",R)", n));
      }
      case D -> {
        for (int q = 0; q <= n; q++) {
          out.add(orthogonal(type, 2 * n - q, q));
        }
        if (n != 4) {
          out.add(form(type, "so*(" + 2 * n + ")", -n));
        }
      }
      default -> {
        for (int character : EXCEPTIONAL.get(type.toString())) {
          String letter = type.series().name().toLowerCase(java.util.Locale.ROOT);
          out.add(form(type, letter + n + "(" + character + ")", character));
        }
      }
    }
    out.sort(java.util.Comparator.comparingInt(RealForm::character));
    return List.copyOf(out);
  }

  /**
   * The real forms of a type with a character.
   *
   * @return more than one where type and character do not decide, first in dimension 153
   */
  public static List<RealForm> of(SimpleType type, int character) {
    return of(type).stream().filter(f -> f.character() == character).toList();
  }

  /** The complex algebra of a type, taken over the real numbers. */
  public static RealForm complexAsReal(SimpleType type) {
    if (type.equals(new SimpleType(Series.A, 1))) {
      return new RealForm("so(3,1)", List.of("sl(2,C)_R", "so(3,C)_R", "sp(2,C)_R"), type, true, 0);
    }
    TypeName c = complexName(type);
    return new RealForm(
        c.name() + "_R", c.otherNames().stream().map(s -> s + "_R").toList(), type, true, 0);
  }

  /** The name of the complex algebra of a type. */
  public static TypeName complexName(SimpleType type) {
    int n = type.rank();
    return switch (type.series()) {
      case A ->
          new TypeName(
              "sl(" + (n + 1) + ",C)",
              n == 1 ? List.of("so(3,C)", "sp(2,C)") : n == 3 ? List.of("so(6,C)") : List.of());
      case B -> new TypeName("so(" + (2 * n + 1) + ",C)", n == 2 ? List.of("sp(4,C)") : List.of());
      case C -> TypeName.of("sp(" + 2 * n + ",C)");
      case D -> TypeName.of("so(" + 2 * n + ",C)");
      default -> TypeName.of(type.toString().toLowerCase(java.util.Locale.ROOT) + "(C)");
    };
  }

  private static void linear(SimpleType type, List<RealForm> out) {
    int order = type.rank() + 1;
    if (order == 2) {
      out.add(form(type, "so(3)", -3, "su(2)", "sp(1)", "su*(2)"));
      out.add(form(type, "sl(2,R)", 1, "so(2,1)", "su(1,1)", "sp(2,R)"));
      return;
    }
    if (order == 4) {
      out.add(form(type, "su(4)", -15, "so(6)"));
      out.add(form(type, "so(5,1)", -5, "su*(4)", "sl(2,H)"));
      out.add(form(type, "su(3,1)", -3, "so*(6)"));
      out.add(form(type, "so(4,2)", 1, "su(2,2)"));
      out.add(form(type, "sl(4,R)", 3, "so(3,3)"));
      return;
    }
    for (int q = 0; q <= order / 2; q++) {
      int p = order - q;
      String name = q == 0 ? "su(" + p + ")" : "su(" + p + "," + q + ")";
      out.add(form(type, name, 1 - (p - q) * (p - q)));
    }
    out.add(form(type, "sl(" + order + ",R)", order - 1));
    if (order % 2 == 0) {
      out.add(form(type, "su*(" + order + ")", -order - 1, "sl(" + order / 2 + ",H)"));
    }
  }

  private static RealForm orthogonal(SimpleType type, int p, int q) {
    String name = so(p, q);
    int order = p + q;
    String[] others =
        order == 5
            ? new String[] {q == 2 ? "sp(4,R)" : sp(2 - q, q)}
            : name.equals("so(6,2)") ? new String[] {"so*(8)"} : new String[0];
    return form(type, name, (order - (p - q) * (p - q)) / 2, others);
  }

  private static String so(int p, int q) {
    return q == 0 ? "so(" + p + ")" : "so(" + p + "," + q + ")";
  }

  private static String sp(int p, int q) {
    return q == 0 ? "sp(" + p + ")" : "sp(" + p + "," + q + ")";
  }

  private static int characterOfSp(int p, int q) {
    return -2 * (p - q) * (p - q) - p - q;
  }

  private static RealForm form(SimpleType type, String name, int character, String... others) {
    return new RealForm(name, List.of(others), type, false, character);
  }
}
