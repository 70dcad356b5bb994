package rankfall.locus;

import java.math.BigInteger;
import java.util.ArrayList;
import java.util.List;
import java.util.SortedMap;
import java.util.TreeMap;
import rankfall.exact.Chain;
import rankfall.exact.Echelon;
import rankfall.exact.Elimination;
import rankfall.exact.Polynomial;
import rankfall.lie.StructureConstants;
import rankfall.lie.StructureConstants.Pair;

/**
 * The algebra at the general point of a branch: structure constants and scales, each up to a common
 * factor, and the Killing matrix that belongs to the constants.
 *
 * @param constants over the chain of the branch
 * @param basis names of the basis
 * @param killing the traces of the constants, reduced on the chain, up to a common factor
 */
public record BranchAlgebra(
    StructureConstants<Polynomial> constants, List<String> basis, List<List<Polynomial>> killing) {
  /** Copies the lists. */
  public BranchAlgebra {
    basis = List.copyOf(basis);
    killing = killing.stream().map(List::copyOf).toList();
  }

  /** The same algebra at the general point of a set inside the branch where nothing degenerates. */
  public BranchAlgebra on(Chain chain) {
    return new BranchAlgebra(reduced(chain, constants), basis, reducedMatrix(chain, killing));
  }

  /** Structure constants reduced on a chain, up to a common factor. */
  public static StructureConstants<Polynomial> reduced(
      Chain chain, StructureConstants<Polynomial> constants) {
    List<Polynomial> all = new ArrayList<>();
    constants.brackets().values().forEach(c -> all.addAll(c.values()));
    List<Polynomial> normal = withoutIntegerContent(chain.reduced(all));
    SortedMap<Pair, SortedMap<Integer, Polynomial>> out = new TreeMap<>();
    int at = 0;
    for (var e : constants.brackets().entrySet()) {
      SortedMap<Integer, Polynomial> row = new TreeMap<>();
      for (Integer k : e.getValue().keySet()) {
        Polynomial p = normal.get(at++);
        if (!p.isZero()) {
          row.put(k, p);
        }
      }
      out.put(e.getKey(), row);
    }
    return new StructureConstants<>(
        chain, constants.dimension(), out, chain.one(), chain.reduced(constants.scale()));
  }

  /** A common factor that is not a number may vanish at special points, so it stays. */
  private static List<Polynomial> withoutIntegerContent(List<Polynomial> all) {
    BigInteger g = all.stream().map(Polynomial::content).reduce(BigInteger.ZERO, BigInteger::gcd);
    if (g.bitLength() < 2) {
      return all;
    }
    return all.stream().map(p -> p.over(Polynomial.constant(p.variables(), g))).toList();
  }

  static List<List<Polynomial>> reducedMatrix(Chain chain, List<List<Polynomial>> matrix) {
    List<Polynomial> all = new ArrayList<>();
    matrix.forEach(all::addAll);
    if (all.isEmpty()) {
      return matrix;
    }
    List<Polynomial> normal = withoutIntegerContent(chain.reduced(all));
    List<List<Polynomial>> out = new ArrayList<>();
    for (int r = 0; r < matrix.size(); r++) {
      out.add(normal.subList(r * matrix.size(), (r + 1) * matrix.size()));
    }
    return out;
  }

  /**
   * The kernel of the Killing form at the general point.
   *
   * @return vectors by basis element, 0 included, in the basis that {@link #basis} names
   */
  public List<List<Polynomial>> kernel() {
    Chain chain = (Chain) constants.domain();
    List<List<Polynomial>> out = new ArrayList<>();
    for (SortedMap<Integer, Polynomial> v :
        killingRank(new KnownNonZero(chain, List.of())).kernel()) {
      List<Polynomial> x = new ArrayList<>();
      for (int i = 0; i < basis.size(); i++) {
        Polynomial c = v.getOrDefault(i, chain.zero());
        x.add(c.times(constants.scale().get(i)));
      }
      out.add(signed(chain.normal(x).entries()));
    }
    return out;
  }

  /** The vector or its negative: the first coefficient that is not 0 has a positive leading one. */
  private static List<Polynomial> signed(List<Polynomial> x) {
    boolean negative =
        x.stream()
            .filter(p -> !p.isZero())
            .findFirst()
            .map(p -> p.leadingCoefficient().signum() < 0)
            .orElse(false);
    return negative ? x.stream().map(Polynomial::negate).toList() : x;
  }

  /** The Killing matrix after row reduction. */
  Echelon<Polynomial> killingRank(KnownNonZero domain) {
    List<SortedMap<Integer, Polynomial>> rows = new ArrayList<>();
    for (List<Polynomial> row : killing) {
      SortedMap<Integer, Polynomial> sparse = new TreeMap<>();
      for (int j = 0; j < row.size(); j++) {
        if (!row.get(j).isZero()) {
          sparse.put(j, row.get(j));
        }
      }
      rows.add(sparse);
    }
    return Elimination.of(domain, rows, killing.size());
  }

  /** The brackets as rows: their rank is the dimension of the derived algebra. */
  Echelon<Polynomial> derivedRank(KnownNonZero domain) {
    return Elimination.of(
        domain, List.copyOf(constants.brackets().values()), constants.dimension());
  }

  /** The equations of central elements: their rank is n minus the dimension of the centre. */
  Echelon<Polynomial> centreRank(KnownNonZero domain) {
    List<SortedMap<Integer, Polynomial>> rows = new ArrayList<>();
    int n = constants.dimension();
    for (int j = 0; j < n; j++) {
      SortedMap<Integer, SortedMap<Integer, Polynomial>> byTarget = new TreeMap<>();
      for (int i = 0; i < n; i++) {
        int source = i;
        constants
            .bracket(i, j)
            .forEach((k, c) -> byTarget.computeIfAbsent(k, x -> new TreeMap<>()).put(source, c));
      }
      rows.addAll(byTarget.values());
    }
    return Elimination.of(domain, rows, n);
  }
}
