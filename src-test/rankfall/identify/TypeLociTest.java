package rankfall.identify;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.Duration;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Random;
import java.util.TreeMap;
import java.util.stream.Collectors;
import org.apache.commons.numbers.fraction.BigFraction;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import rankfall.exact.Polynomial;
import rankfall.exact.Rationals;
import rankfall.lie.Family;
import rankfall.lie.FamilySite;
import rankfall.lie.Span;
import rankfall.locus.Meter;
import rankfall.locus.Partition;
import rankfall.locus.Strata;

/** Where names change inside strata. */
class TypeLociTest {
  private static final String NINE = shipped("bianchi-types");

  private static String shipped(String file) {
    try {
      return Files.readString(Path.of("specs", file + ".yaml"));
    } catch (IOException e) {
      throw new java.io.UncheckedIOException(e);
    }
  }

  private static Meter meter() {
    return new Meter(Duration.ofMinutes(5), 20_000);
  }

  private static List<Strata.Stratum> strata(Family family) {
    Meter meter = meter();
    return Partition.start(family, meter).completed(family, meter).strata().orElseThrow().strata();
  }

  private static TypeLoci loci(Family family, Strata.Stratum s) {
    return TypeLoci.of(s, family.ring().constants(), meter());
  }

  private static String text(List<Polynomial> equations) {
    return equations.stream().map(Polynomial::toString).collect(Collectors.joining("; "));
  }

  private static TypeLoci of(Family family, int rank, int derived) {
    Strata.Stratum stratum =
        strata(family).stream()
            .filter(s -> s.profile().rank() == rank && s.profile().derived() == derived)
            .findFirst()
            .orElseThrow();
    return loci(family, stratum);
  }

  /**
   * The table of Ellis and MacCallum 1969 by n and a: among the algebras with a derived algebra of
   * dimension 2, a = 0 gives VI_0 and VII_0, a matrix n of rank 1 gives IV, n = 0 gives V, and the
   * general ones are VI_h and VII_h with h = a1^2/(n22 n33 - n23^2) (h = a^2/(n2 n3) where a stands
   * along the first axis and n is diagonal). The sign of n22 n33 - n23^2 tells VI from VII.
   */
  @Test
  void nineParametersOfDimensionThree() {
    Family family = PointAlgebra.family(NINE);
    TypeLoci loci = of(family, 1, 2);
    String minors =
        "n11*n22 - n12^2; n11*n23 - n12*n13; n11*n33 - n13^2; n12*n23 - n13*n22;"
            + " n12*n33 - n13*n23; n22*n33 - n23^2";
    assertEquals(
        List.of("", "a1; a2; a3", minors, "n11; n12; n13; n22; n23; n33"),
        loci.loci().stream().map(l -> text(l.equations())).toList());
    TypeLoci.Locus general = loci.loci().get(0);
    assertEquals(
        List.of("a1; a2; a3", minors),
        general.exclusions().stream().map(TypeLociTest::text).toList());
    assertEquals("n22*n33 - n23^2", text(general.walls()));
    assertTrue(general.proved());
    TypeName atPoint = new TypeName("Bianchi VI_h, h = -4/9", List.of("A_{3,5}, a = 1/5"));
    assertEquals(
        new TypeName("Bianchi VI_h, h = a1^2/(n22*n33 - n23^2)", List.of("A_{3,5}")),
        general.onCell(atPoint));
  }

  /** The number h of Ellis and MacCallum 1969 where a has a first component, point by point. */
  @Test
  void hIsTheValueOfItsExpression() {
    Family family = PointAlgebra.family(NINE);
    Random random = new Random(8);
    int asked = 0;
    for (int k = 0; k < 60; k++) {
      List<BigFraction> p = solved(random);
      BigFraction below = p.get(3).multiply(p.get(5)).subtract(p.get(4).multiply(p.get(4)));
      if (p.get(6).signum() != 0 && below.signum() != 0) {
        BigFraction h = p.get(6).multiply(p.get(6)).divide(below);
        String type = below.signum() > 0 ? "Bianchi VII_h" : "Bianchi VI_h";
        TypeName name = Bianchi.of(at(family, p));
        String due = type + ", h = " + Rationals.text(h);
        assertTrue(name.name().equals(due) || name.otherNames().contains(due), () -> due + name);
        asked++;
      }
    }
    assertTrue(asked > 20, "points: " + asked);
  }

  /** A random a and n = r u u^T + s v v^T with u and v orthogonal to a, so that n a = 0. */
  private static List<BigFraction> solved(Random random) {
    int[] a = random.ints(3, -2, 3).toArray();
    int[] u = {a[1], -a[0], 0};
    int[] v = {a[2], 0, -a[0]};
    int r = random.nextInt(7) - 3;
    int s = random.nextInt(7) - 3;
    List<BigFraction> out = new ArrayList<>();
    for (int i = 0; i < 3; i++) {
      for (int j = i; j < 3; j++) {
        out.add(BigFraction.of(r * u[i] * u[j] + s * v[i] * v[j]));
      }
    }
    for (int x : a) {
      out.add(BigFraction.of(x));
    }
    return out;
  }

  /** A family of dimension 4 with the eigenvalues of a class of Patera and others 1976. */
  private static String four(String parameters, String brackets) {
    return "family: test\nparameters: ["
        + parameters
        + "]\ngenerators: [e1, e2, e3, e4]\nbrackets: |\n  "
        + brackets.replace("; ", "\n  ")
        + "\n";
  }

  private static final String DIAGONAL =
      four("a, b", "[e1,e4] = e1; [e2,e4] = a*e2; [e3,e4] = b*e3");
  private static final String ROTATION =
      four("a, b, c", "[e1,e4] = a*e1; [e2,e4] = b*e2 - c*e3; [e3,e4] = e2 + b*e3");
  private static final String ON_HEISENBERG =
      four("a, c", "[e2,e3] = e1; [e1,e4] = 2*a*e1; [e2,e4] = a*e2 - c*e3; [e3,e4] = e2 + a*e3");
  private static final String PLANES =
      four("s, t", "[e1,e3] = e1; [e2,e3] = e2; [e1,e4] = s*e1 - t*e2; [e2,e4] = e1 + s*e2");

  /**
   * diag(1, a, b): the class does not change where two eigenvalues meet (the matrix stays
   * diagonal), but the two parameters become one; ratios by Patera and others 1976, A_{4,5}, from
   * memory.
   */
  @Test
  void diagonalActionKeepsItsEigenvalues() {
    TypeLoci loci = of(PointAlgebra.family(DIAGONAL), 1, 3);
    assertEquals(
        List.of("", "a - 1", "a - 1; b - 1", "a - b", "b - 1"),
        loci.loci().stream().map(l -> text(l.equations())).toList());
    assertEquals(
        "A_{4,5}, eigenvalues in the ratio 1 : a : b",
        loci.loci().get(0).onCell(TypeName.of("A_{4,5}, a = 1/3, b = 1/2")).name());
    assertEquals(
        "A_{4,5}, eigenvalues in the ratio 1 : b : b",
        loci.loci().get(3).onCell(TypeName.of("A_{4,5}, a = 1/3, b = 1/3")).name());
    assertEquals(
        "A_{4,5}, a = 1, b = 1",
        loci.loci().get(2).onCell(TypeName.of("A_{4,5}, a = 1, b = 1")).name());
  }

  static List<String> families() {
    return List.of(
        NINE,
        DIAGONAL,
        ROTATION,
        ON_HEISENBERG,
        PLANES,
        shipped("merging-frames"),
        shipped("scaled-ladder"),
        shipped("kinematics-ten"));
  }

  /**
   * Two roads: names at random points against the loci. In one locus, where the signs of the walls
   * and the signature agree and are not 0, the names agree but for numbers; every point of a
   * stratum lies in exactly one locus.
   */
  @ParameterizedTest
  @MethodSource("families")
  void namesAtPointsAgree(String yaml) {
    Family family = PointAlgebra.family(yaml);
    List<List<BigFraction>> points = points(family);
    Map<String, String> names = new TreeMap<>();
    int asked = 0;
    for (Strata.Stratum s : strata(family)) {
      TypeLoci loci = loci(family, s);
      for (List<BigFraction> p : points) {
        if (!lies(p, s.equations(), s.exclusions())) {
          continue;
        }
        List<TypeLoci.Locus> here =
            loci.loci().stream().filter(l -> lies(p, l.equations(), l.exclusions())).toList();
        assertEquals(1, here.size(), () -> "loci at " + p);
        TypeLoci.Locus locus = here.get(0);
        ExactAlgebra g = at(family, p);
        TypeName atPoint = AlgebraNames.of(g).orElse(TypeName.of("no name"));
        asked++;
        if (locus.walls().stream().anyMatch(w -> w.at(p).signum() == 0)) {
          continue;
        }
        String signs = locus.walls().stream().map(w -> w.at(p).signum() + "").toList().toString();
        String key =
            s.equations()
                + " "
                + text(locus.equations())
                + signs
                + Forms.signature(rankfall.lie.AlgebraFacts.of(g.constants()).killing(), g);
        TypeName onCell = locus.onCell(atPoint);
        String before = names.putIfAbsent(key, onCell.toString());
        assertTrue(
            before == null || before.equals(onCell.toString()),
            () -> key + " at " + p + ": " + before + " and " + onCell);
      }
    }
    assertTrue(asked > 20, "points in strata: " + asked);
  }

  private static boolean lies(
      List<BigFraction> p, List<Polynomial> equations, List<List<Polynomial>> exclusions) {
    return vanish(p, equations) && exclusions.stream().noneMatch(e -> vanish(p, e));
  }

  private static boolean vanish(List<BigFraction> p, List<Polynomial> equations) {
    return equations.stream().allMatch(q -> q.at(p).signum() == 0);
  }

  /** Points with small coordinates, many of them 0, those of one family that has any. */
  private static List<List<BigFraction>> points(Family family) {
    int n = family.ring().variables().count();
    Random random = new Random(20);
    List<List<BigFraction>> out = new ArrayList<>();
    for (int tries = 0; tries < 20_000 && out.size() < 150; tries++) {
      List<BigFraction> p = new ArrayList<>();
      for (int k = 0; k < n; k++) {
        int above = random.nextInt(3) == 0 ? 0 : random.nextInt(7) - 3;
        p.add(BigFraction.of(above, random.nextInt(4) == 0 ? 2 : 1));
      }
      if (site(family, p) instanceof FamilySite.Rational r
          && Span.of(r.input()) instanceof Span.Closed<?>) {
        out.add(p);
      }
    }
    return out;
  }

  private static FamilySite site(Family family, List<BigFraction> p) {
    Map<String, BigFraction> values = new LinkedHashMap<>();
    List<String> names = family.ring().variables().names();
    for (int k = 0; k < names.size(); k++) {
      values.put(names.get(k), p.get(k));
    }
    return family.at(values);
  }

  private static ExactAlgebra at(Family family, List<BigFraction> p) {
    Map<String, String> values = new LinkedHashMap<>();
    List<String> names = family.ring().variables().names();
    for (int k = 0; k < names.size(); k++) {
      values.put(names.get(k), Rationals.text(p.get(k)));
    }
    return PointAlgebra.of(family, values);
  }
}
