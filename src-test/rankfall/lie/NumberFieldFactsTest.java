package rankfall.lie;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.math.BigInteger;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.SortedMap;
import java.util.TreeMap;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import rankfall.exact.Chain;
import rankfall.exact.Polynomial;
import rankfall.exact.Variables;

/** Facts over the field of w with w^2 = 2, w the positive or the negative root. */
class NumberFieldFactsTest {
  private static final Variables W = new Variables(List.of("w"));
  private static final Polynomial ROOT = Polynomial.variable(W, 0);
  private static final Polynomial ONE = Polynomial.one(W);
  private static final Chain FIELD =
      new Chain(W, List.of(new Chain.Rule(0, ROOT.times(ROOT).minus(Polynomial.constant(W, 2)))));

  /** The sign of a + b w from the signs of a, b and a^2 - 2 b^2. */
  private static int signum(Polynomial p, int rootSign) {
    Polynomial reduced = FIELD.reduced(p);
    BigInteger a = reduced.coefficient(0, 0).constantValue();
    BigInteger b = reduced.coefficient(0, 1).constantValue();
    int second = b.signum() * rootSign;
    if (a.signum() == second || second == 0) {
      return a.signum();
    }
    int first = a.pow(2).compareTo(b.pow(2).shiftLeft(1));
    return first > 0 ? a.signum() : second;
  }

  /**
   * [e2,e3] = e1, [e3,e1] = e2, [e1,e2] = w e3: compact for positive w, else not (Bianchi IX and
   * VIII); Killing form -2 diag(w, w, 1), from memory.
   */
  @ParameterizedTest
  @CsvSource({"1, 0, 3", "-1, 2, 1"})
  void chosenRootDecidesTheRealForm(int rootSign, int plus, int minus) {
    SortedMap<StructureConstants.Pair, SortedMap<Integer, Polynomial>> c = new TreeMap<>();
    c.put(new StructureConstants.Pair(1, 2), new TreeMap<>(Map.of(0, ONE)));
    c.put(new StructureConstants.Pair(0, 2), new TreeMap<>(Map.of(1, ONE.negate())));
    c.put(new StructureConstants.Pair(0, 1), new TreeMap<>(Map.of(2, ROOT)));
    PointFacts f =
        PointAnalysis.of(
            new StructureConstants<>(FIELD, 3, c, ONE, List.of(ONE, ONE, ONE)),
            3,
            p -> signum(p, rootSign),
            (p, q) -> FIELD.reduced(p).over(q).toString());
    assertEquals(Optional.of(new Signature(plus, minus, 0)), f.killing().signature());
    assertEquals(rootSign > 0, f.compact());
    assertEquals("-16", f.killing().determinant());
    assertEquals(
        List.of(List.of("-2*w", "0", "0"), List.of("0", "-2*w", "0"), List.of("0", "0", "-2")),
        f.killing().matrix());
    assertEquals(List.of(3), f.derivedSeries());
    assertEquals(new PointFacts.Forms(1, new MaximalRank(3, true)), f.invariantForms());
  }

  /** n = (1, 1, w^2 - 2): the third constant is 0 in the field though not as written. */
  @ParameterizedTest
  @CsvSource({"1", "-1"})
  void hiddenZeroIsSeen(int rootSign) {
    SortedMap<StructureConstants.Pair, SortedMap<Integer, Polynomial>> c = new TreeMap<>();
    c.put(new StructureConstants.Pair(1, 2), new TreeMap<>(Map.of(0, ONE)));
    c.put(new StructureConstants.Pair(0, 2), new TreeMap<>(Map.of(1, ONE.negate())));
    Polynomial hidden = ROOT.times(ROOT).minus(Polynomial.constant(W, 2));
    c.put(new StructureConstants.Pair(0, 1), new TreeMap<>(Map.of(2, hidden)));
    PointFacts f =
        PointAnalysis.of(
            new StructureConstants<>(FIELD, 3, c, ONE, List.of(ONE, ONE, ONE)),
            3,
            p -> signum(p, rootSign),
            (p, q) -> FIELD.reduced(p).over(q).toString());
    assertEquals(Optional.of(new Signature(0, 1, 2)), f.killing().signature());
    assertEquals(List.of(3, 2, 0), f.derivedSeries());
    assertEquals(2, f.nilradical());
  }
}
