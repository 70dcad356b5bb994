package rankfall.lie;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.math.BigInteger;
import java.util.ArrayList;
import java.util.List;
import java.util.Random;
import java.util.SortedMap;
import java.util.TreeMap;
import java.util.stream.IntStream;
import java.util.stream.Stream;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** Laws that hold for every algebra, on known and on random ones in random bases. */
class AlgebraLawsTest {
  private static final long PRIME = 2147483629L;

  static Stream<Brackets> algebras() {
    return Stream.concat(
        Samples.varied().stream(), IntStream.range(0, 40).mapToObj(AlgebraLawsTest::random));
  }

  /** A random derivation of R^m, or of Heisenberg plus R^k, and the ideal it acts on. */
  private static Brackets random(int seed) {
    Random r = new Random(seed);
    int m = 2 + r.nextInt(4);
    StringBuilder text = new StringBuilder();
    for (int i = 2; i <= m + 1; i++) {
      for (int j = 2; j <= m + 1; j++) {
        int c = r.nextInt(3) == 0 ? r.nextInt(5) - 2 : 0;
        if (c != 0) {
          text.append(text.isEmpty() ? "" : ", ").append("1 " + i + " " + j + " " + c);
        }
      }
    }
    Brackets solvable = Brackets.of(m + 1, text.toString());
    return r.nextInt(3) == 0 ? solvable.plus(Samples.so3()) : solvable;
  }

  private static <E> String profile(StructureConstants<E> c) {
    AlgebraFacts<E> f = AlgebraFacts.of(c);
    InvariantForms<E> forms = InvariantForms.of(LieBracket.of(c));
    return String.join(
        " ",
        "" + f.killingRank(),
        "" + f.derivedSeries().dimensions(),
        "" + f.lowerCentralSeries().dimensions(),
        "centre " + f.centre().dimension(),
        "radical " + f.radical().dimension(),
        "nilradical " + f.nilradical().dimension(),
        "unimodular " + f.unimodular(),
        "forms " + forms.count(),
        "rank " + forms.maximalRank());
  }

  @ParameterizedTest
  @MethodSource("algebras")
  void nothingDependsOnTheBasis(Brackets algebra) {
    String expected = profile(algebra.overIntegers());
    for (int seed = 0; seed < 3; seed++) {
      assertEquals(expected, profile(algebra.inRandomBasis(seed, 8).overIntegers()));
    }
    Brackets turned = algebra.inRandomBasis(7, 8);
    assertEquals(algebra.facts().killing().signature(), turned.facts().killing().signature());
    assertEquals(algebra.facts().killing().determinant(), turned.facts().killing().determinant());
  }

  @ParameterizedTest
  @MethodSource("algebras")
  void sameOverALargePrimeField(Brackets algebra) {
    assertEquals(profile(algebra.overIntegers()), profile(algebra.modulo(PRIME)));
  }

  /** Standard inclusions (Humphreys, chapters I and II). */
  @ParameterizedTest
  @MethodSource("algebras")
  void idealsLieInOneAnother(Brackets algebra) {
    StructureConstants<BigInteger> c = algebra.inRandomBasis(5, 6).overIntegers();
    LieBracket<BigInteger> bracket = LieBracket.of(c);
    AlgebraFacts<BigInteger> f = AlgebraFacts.of(bracket);
    Subspace<BigInteger> all = Subspace.whole(c.domain(), c.dimension());
    assertTrue(f.nilradical().contains(f.centre()));
    assertTrue(f.radical().contains(f.nilradical()));
    assertTrue(f.nilradical().contains(Ideals.bracket(bracket, all, f.radical())));
    assertTrue(f.nilradical().contains(Ideals.bracket(bracket, all, f.nilradical())));
    assertTrue(f.radical().contains(f.killingKernel()));
    assertTrue(f.killingKernel().contains(f.nilradical()));
    assertEquals(f.derivedSeries().reachesZero(), f.solvable());
    assertEquals(f.nilpotent(), f.nilradical().dimension() == f.dimension());
    assertEquals(f.semisimple(), f.dimension() > 0 && f.radical().dimension() == 0);
    if (f.semisimple() || f.nilpotent()) {
      assertTrue(f.unimodular());
    }
  }

  /**
   * Second road: x in the radical with tr(ad x a) = 0 for all a in the associative algebra that ad
   * g generates (Beck, Kolman, Stewart 1977), that algebra computed in full.
   */
  @ParameterizedTest
  @MethodSource("algebras")
  void nilradicalIsThatOfTheAssociativeAlgebra(Brackets algebra) {
    StructureConstants<Long> c = algebra.inRandomBasis(3, 5).modulo(PRIME);
    LieBracket<Long> bracket = LieBracket.of(c);
    AlgebraFacts<Long> f = AlgebraFacts.of(bracket);
    int n = c.dimension();
    Vectors<Long> v = new Vectors<>(c.domain());
    List<List<SortedMap<Integer, Long>>> ad = v.units(n).stream().map(bracket::adjoint).toList();
    List<List<SortedMap<Integer, Long>>> envelope = envelope(v, n, ad);
    List<SortedMap<Integer, Long>> conditions = new ArrayList<>();
    for (List<SortedMap<Integer, Long>> a : envelope) {
      SortedMap<Integer, Long> row = new TreeMap<>();
      for (int i = 0; i < n; i++) {
        for (int j = 0; j < n; j++) {
          for (var e : ad.get(i).get(j).entrySet()) {
            v.add(row, i, c.domain().times(e.getValue(), a.get(e.getKey()).getOrDefault(j, 0L)));
          }
        }
      }
      conditions.add(row);
    }
    Subspace<Long> expected = Subspace.kernel(c.domain(), n, conditions);
    assertEquals(expected.dimension(), f.nilradical().dimension());
    assertTrue(expected.contains(f.nilradical()));
  }

  private static List<List<SortedMap<Integer, Long>>> envelope(
      Vectors<Long> v, int n, List<List<SortedMap<Integer, Long>>> ad) {
    List<List<SortedMap<Integer, Long>>> out = new ArrayList<>(List.of(v.units(n)));
    Subspace<Long> span = Subspace.span(v.domain(), n * n, List.of(flat(v.units(n))));
    for (int at = 0; at < out.size() && n > 0; at++) {
      for (List<SortedMap<Integer, Long>> a : ad) {
        List<SortedMap<Integer, Long>> product = new ArrayList<>();
        for (SortedMap<Integer, Long> row : out.get(at)) {
          SortedMap<Integer, Long> sum = new TreeMap<>();
          row.forEach((j, e) -> v.add(sum, e, a.get(j)));
          product.add(sum);
        }
        if (!span.contains(flat(product))) {
          List<SortedMap<Integer, Long>> more = new ArrayList<>(span.basis());
          more.add(flat(product));
          span = Subspace.span(v.domain(), n * n, more);
          out.add(product);
        }
      }
    }
    return out;
  }

  private static SortedMap<Integer, Long> flat(List<SortedMap<Integer, Long>> matrix) {
    SortedMap<Integer, Long> out = new TreeMap<>();
    for (int i = 0; i < matrix.size(); i++) {
      int row = i * matrix.size();
      matrix.get(i).forEach((j, e) -> out.put(row + j, e));
    }
    return out;
  }

  /** Second road: count the central elements and the invariant forms over a tiny field. */
  @ParameterizedTest
  @MethodSource("small")
  void centreAndFormsByCountingOverThreeElements(Brackets algebra) {
    StructureConstants<Long> c = algebra.inRandomBasis(2, 4).modulo(3);
    LieBracket<Long> bracket = LieBracket.of(c);
    int n = c.dimension();
    long central = 0;
    for (SortedMap<Integer, Long> x : vectors(n)) {
      central += bracket.adjoint(x).stream().allMatch(SortedMap::isEmpty) ? 1 : 0;
    }
    assertEquals(Math.round(Math.pow(3, Ideals.centre(bracket).dimension())), central);
    InvariantForms<Long> forms = InvariantForms.of(bracket);
    long invariant = 0;
    for (SortedMap<Integer, Long> b : vectors(n * (n + 1) / 2)) {
      InvariantForms<Long> one =
          new InvariantForms<>(n, new Subspace<>(c.domain(), b.size(), List.of(b), List.of()));
      invariant += isInvariant(bracket, one.matrices().get(0)) ? 1 : 0;
    }
    assertEquals(Math.round(Math.pow(3, forms.count())), invariant);
  }

  private static boolean isInvariant(LieBracket<Long> bracket, List<SortedMap<Integer, Long>> b) {
    Vectors<Long> v = new Vectors<>(bracket.domain());
    int n = bracket.dimension();
    for (int i = 0; i < n; i++) {
      for (int j = 0; j < n; j++) {
        for (int k = 0; k < n; k++) {
          long left = v.pair(bracket.of(i, j), b.get(k));
          long right = v.pair(bracket.of(i, k), b.get(j));
          if ((left + right) % 3 != 0) {
            return false;
          }
        }
      }
    }
    return true;
  }

  static Stream<Brackets> small() {
    return algebras().filter(b -> b.dimension() <= 4 && b.dimension() > 0);
  }

  private static List<SortedMap<Integer, Long>> vectors(int n) {
    List<SortedMap<Integer, Long>> out = new ArrayList<>();
    int count = (int) Math.round(Math.pow(3, n));
    for (int code = 0; code < count; code++) {
      SortedMap<Integer, Long> x = new TreeMap<>();
      for (int k = 0, rest = code; k < n; k++, rest /= 3) {
        if (rest % 3 != 0) {
          x.put(k, (long) (rest % 3));
        }
      }
      out.add(x);
    }
    return out;
  }
}
