package rankfall.locus;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.stream.Collectors;
import java.util.stream.IntStream;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import rankfall.Analysis;
import rankfall.exact.GroebnerBasis;
import rankfall.exact.Polynomial;
import rankfall.exact.Variables;
import rankfall.published.PublishedEntry;
import rankfall.published.PublishedTables;

/** Partitions of families that the literature knows; closed sets are compared by their zeros. */
class PublishedPartitionsTest {

  static Stream<PublishedEntry> tables() {
    return PublishedTables.all().stream().filter(e -> e.strata().isPresent());
  }

  /** The tables name a source beside each entry; where a text differs, the ideals are the same. */
  @ParameterizedTest(name = "{0}")
  @MethodSource("tables")
  void theStrataAreThoseOfTheTables(PublishedEntry entry) {
    Analysed family = Analysed.published(entry.id());
    List<Analysis.Stratum> open = new ArrayList<>(family.strata());
    for (PublishedEntry.Stratum due : entry.strata().orElseThrow()) {
      Analysis.Stratum found =
          open.stream()
              .filter(s -> isThat(family, due, s))
              .findFirst()
              .orElseThrow(() -> new AssertionError(due + " is not in " + family.rows()));
      open.remove(found);
    }
    assertEquals(List.of(), open);
  }

  private static boolean isThat(
      Analysed family, PublishedEntry.Stratum due, Analysis.Stratum found) {
    return due.profile()
            .equals(List.of(found.dimension(), found.rank(), found.derived(), found.centre()))
        && (sorted(due.equations()).equals(sorted(Analysed.text(found.equations())))
            || new GroebnerBasis(family.constants())
                .reduced(joined(read(family, due.equations()), relations(family)))
                .equals(found.equations()));
  }

  /** The tables leave them out. */
  private static List<Polynomial> relations(Analysed family) {
    return family.analysis().findings().orElseThrow().relations().stream()
        .filter(r -> r.origin() == Analysis.Origin.SPEC)
        .map(Analysis.Relation::polynomial)
        .toList();
  }

  /** Equations of a family without algebraic numbers, read as the relations of a spec. */
  private static List<Polynomial> read(Analysed family, String equations) {
    Variables own = new Variables(family.spec().parameters());
    if (!family.constants().variables().equals(own) || equations.equals("0")) {
      return List.of();
    }
    String where =
        Arrays.stream(equations.split("; "))
            .map(e -> "  - \"" + e + " = 0\"\n")
            .collect(Collectors.joining());
    String yaml =
        "family: reader\nparameters: ["
            + family.spec().parameters().stream()
                .map(p -> "\"" + p + "\"")
                .collect(Collectors.joining(", "))
            + "]\nwhere:\n"
            + where
            + "generators: [X_, Y_]\nbrackets: |\n  [X_, Y_] = 0\n";
    return Analysed.relations(yaml);
  }

  private static String sorted(String equations) {
    return Arrays.stream(equations.split("; ")).sorted().toList().toString();
  }

  /**
   * Ellis and MacCallum 1969: Behr's form with a symmetric matrix n and a vector a, n a = 0. Class
   * A with invertible n is VIII and IX; III is where the cofactors of n are -a_i a_j, VII_1 where
   * they are +a_i a_j (h = a^2 / (n_2 n_3) in the frame where n is diagonal), II and I have a = 0
   * and n of rank 1 and 0, the others are one stratum.
   */
  @Test
  void bianchiTypesInNineParameters() {
    Analysed family = Analysed.shipped("bianchi-types");
    Variables v = new Variables(family.spec().parameters());
    List<List<Polynomial>> n = symmetric(v, "n", 3);
    List<Polynomial> a = List.of(variable(v, "a1"), variable(v, "a2"), variable(v, "a3"));
    List<Polynomial> na =
        n.stream()
            .map(
                row ->
                    IntStream.range(0, 3)
                        .mapToObj(k -> row.get(k).times(a.get(k)))
                        .reduce(Polynomial.zero(v), Polynomial::plus))
            .toList();
    assertEquals(6, family.strata().size());
    sameZeros(family, family.with(3, 3, 3, 0), a);
    sameZeros(family, family.with(3, 1, 2, 0), joined(na, minors(n, 3)));
    sameZeros(family, family.with(3, 1, 1, 1), joined(na, cofactorsLess(n, a, -1)));
    sameZeros(family, family.with(3, 0, 2, 0), joined(na, cofactorsLess(n, a, 1)));
    sameZeros(family, family.with(3, 0, 1, 1), joined(a, minors(n, 2)));
    sameZeros(family, family.with(3, 0, 0, 3), joined(a, minors(n, 1)));
    assertEquals(2, family.analysis().findings().orElseThrow().components().size());
  }

  /**
   * Bacry and Levy-Leblond 1968: de Sitter; Poincare and its dual; Newton and Hooke; Carroll;
   * Galilei and its dual; static. The profiles follow from the brackets: J, P, K are always
   * derived, H is where m is not 0; H is central where a = b = 0; K(H, H) = 6 a b.
   */
  @Test
  void kinematicalAlgebras() {
    assertEquals(
        List.of(
            "0 (10,10,10,0)",
            "a (10,6,10,0)",
            "b (10,6,10,0)",
            "m (10,4,9,0)",
            "a; b (10,3,10,1)",
            "a; m (10,3,9,0)",
            "b; m (10,3,9,0)",
            "a; b; m (10,3,9,1)"),
        Analysed.shipped("kinematics-ten").rows());
  }

  /**
   * Helgason 1978, ch. X, sec. 2 for the algebra; a metric of rank k keeps so(k) and k (n - k)
   * translations. The closure of rank at most k is cut out by the minors of order k + 1 (Bruns and
   * Vetter, Determinantal Rings, 1988).
   */
  @Test
  void ranksOfAMetric() {
    Analysed four = Analysed.shipped("metric-rotations-4");
    List<List<Polynomial>> g = symmetric(new Variables(four.spec().parameters()), "g", 4);
    assertEquals(5, four.strata().size());
    assertEquals(List.of(), four.with(6, 6, 6, 0).equations());
    sameIdeal(four, four.with(6, 3, 6, 0), minors(g, 4));
    sameIdeal(four, four.with(5, 1, 4, 0), minors(g, 3));
    sameIdeal(four, four.with(3, 0, 0, 3), minors(g, 2));
    sameIdeal(four, four.with(0, 0, 0, 0), minors(g, 1));
    Analysed three = Analysed.shipped("metric-rotations-3");
    List<List<Polynomial>> h = symmetric(new Variables(three.spec().parameters()), "g", 3);
    assertEquals(4, three.strata().size());
    assertEquals(List.of(), three.with(3, 3, 3, 0).equations());
    sameIdeal(three, three.with(3, 1, 2, 0), minors(h, 3));
    sameIdeal(three, three.with(2, 0, 0, 2), minors(h, 2));
    sameIdeal(three, three.with(0, 0, 0, 0), minors(h, 1));
  }

  /**
   * Shelton, Taylor and Wecht 2005: the quadratic constraints of the fluxes, here f1 q1 = f2 q2 = h
   * r. Without the non-geometric fluxes q1, q2 and r the general algebra is iso(3).
   */
  @Test
  void quadraticConstraintsOfSixFluxes() {
    Analysed family = Analysed.shipped("flux-six");
    Variables v = new Variables(family.spec().parameters());
    Polynomial hr = variable(v, "h").times(variable(v, "r"));
    List<Polynomial> constraints =
        List.of(
            hr.minus(variable(v, "f1").times(variable(v, "q1"))),
            hr.minus(variable(v, "f2").times(variable(v, "q2"))));
    sameIdeal(family, family.with(6, 6, 6, 0), constraints);
    assertEquals(1, family.analysis().findings().orElseThrow().components().size());
    assertTrue(
        family.all(6, 3, 6, 0).stream()
            .anyMatch(s -> Analysed.text(s.equations()).equals("q1; q2; r")),
        family.rows().toString());
    GroebnerBasis bases = new GroebnerBasis(family.constants());
    for (Analysis.Stratum s : family.strata()) {
      assertEquals(s.equations(), bases.reduced(joined(s.equations(), constraints)), s.name());
    }
  }

  /** Inonu and Wigner 1953: so(3,1) and so(4) contract to the motions of space, iso(3). */
  @Test
  void boostsContractToTranslations() {
    assertEquals(
        List.of("0 (6,6,6,0)", "c (6,3,6,0)"), Analysed.shipped("lorentz-to-euclid").rows());
  }

  private static Polynomial variable(Variables v, String name) {
    return Polynomial.variable(v, name);
  }

  private static List<List<Polynomial>> symmetric(Variables v, String letter, int n) {
    return IntStream.rangeClosed(1, n)
        .mapToObj(
            i ->
                IntStream.rangeClosed(1, n)
                    .mapToObj(j -> variable(v, letter + Math.min(i, j) + Math.max(i, j)))
                    .toList())
        .toList();
  }

  private static List<Polynomial> joined(List<Polynomial> a, List<Polynomial> b) {
    return Stream.concat(a.stream(), b.stream()).toList();
  }

  private static List<Polynomial> cofactorsLess(
      List<List<Polynomial>> n, List<Polynomial> a, int sign) {
    List<Polynomial> out = new ArrayList<>();
    for (int i = 0; i < 3; i++) {
      for (int j = 0; j < 3; j++) {
        List<Integer> rows = without(i);
        List<Integer> columns = without(j);
        Polynomial minor = determinant(n, rows, columns);
        Polynomial cofactor = (i + j) % 2 == 0 ? minor : minor.negate();
        Polynomial aa = a.get(i).times(a.get(j));
        out.add(sign > 0 ? cofactor.minus(aa) : cofactor.plus(aa));
      }
    }
    return out;
  }

  private static List<Integer> without(int i) {
    return IntStream.range(0, 3).filter(k -> k != i).boxed().toList();
  }

  private static List<Polynomial> minors(List<List<Polynomial>> matrix, int order) {
    List<Polynomial> out = new ArrayList<>();
    for (List<Integer> rows : subsets(matrix.size(), order)) {
      for (List<Integer> columns : subsets(matrix.size(), order)) {
        out.add(determinant(matrix, rows, columns));
      }
    }
    return out;
  }

  private static List<List<Integer>> subsets(int n, int size) {
    return IntStream.range(0, 1 << n)
        .filter(bits -> Integer.bitCount(bits) == size)
        .mapToObj(bits -> IntStream.range(0, n).filter(k -> (bits >> k & 1) == 1).boxed().toList())
        .toList();
  }

  /** By the first row. */
  private static Polynomial determinant(
      List<List<Polynomial>> matrix, List<Integer> rows, List<Integer> columns) {
    Variables v = matrix.get(0).get(0).variables();
    if (rows.isEmpty()) {
      return Polynomial.one(v);
    }
    Polynomial sum = Polynomial.zero(v);
    for (int k = 0; k < columns.size(); k++) {
      List<Integer> others = new ArrayList<>(columns);
      others.remove(k);
      Polynomial term =
          matrix
              .get(rows.get(0))
              .get(columns.get(k))
              .times(determinant(matrix, rows.subList(1, rows.size()), others));
      sum = k % 2 == 0 ? sum.plus(term) : sum.minus(term);
    }
    return sum;
  }

  private static void sameIdeal(Analysed family, Analysis.Stratum s, List<Polynomial> expected) {
    assertEquals(new GroebnerBasis(family.constants()).reduced(expected), s.equations(), s.name());
  }

  private static void sameZeros(Analysed family, Analysis.Stratum s, List<Polynomial> expected) {
    GroebnerBasis bases = new GroebnerBasis(family.constants());
    assertEquals(
        s.equations(),
        bases.reduced(joined(s.equations(), expected)),
        "does not hold on " + s.name());
    for (Polynomial p : s.equations()) {
      assertTrue(bases.radicalContains(expected, p), p + " of " + s.name() + " holds on less");
    }
  }
}
