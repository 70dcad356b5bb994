package rankfall.locus;

import java.util.ArrayDeque;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.Deque;
import java.util.List;
import java.util.Optional;
import java.util.SortedMap;
import java.util.TreeMap;
import java.util.stream.Collectors;
import rankfall.exact.Chain;
import rankfall.exact.Polynomial;
import rankfall.lie.InvariantForms;
import rankfall.lie.LieBracket;
import rankfall.lie.MaximalRank;
import rankfall.lie.NonDegenerateMember;
import rankfall.lie.StructureConstants;

/**
 * The invariant symmetric forms all over a stratum: at its general point, and where inside it their
 * number changes or a non-degenerate one appears or disappears.
 *
 * @param general at the general point
 * @param basis of the forms there, in the basis of the algebra; matrices of sparse rows
 * @param chain the set over which the basis is given
 * @param deviations where inside the stratum it is otherwise
 * @param settled whether these are all; else the search was too long
 */
public record FormSpaces(
    Facts general,
    List<List<SortedMap<Integer, Polynomial>>> basis,
    Chain chain,
    List<Deviation> deviations,
    boolean settled) {
  /** Most products of terms that one stratum may cost. */
  private static final long MOST_PRODUCTS = 400_000;

  /** Longest polynomial whose zeros are looked at, in terms. */
  private static final int LONGEST_WATCHED = 40;

  /** Whether a non-degenerate form exists. */
  public enum Existence {
    /** One does. */
    YES,
    /** None does. */
    NO,
    /** It was not decided. */
    UNKNOWN
  }

  /**
   * What is said of the forms at a point.
   *
   * @param dimension of their space
   * @param nonDegenerate whether one of them is not degenerate
   */
  public record Facts(int dimension, Existence nonDegenerate) {}

  /**
   * Points of the stratum at which it is otherwise.
   *
   * @param facts what holds there
   * @param equations what these points satisfy beyond the equations of the stratum
   */
  public record Deviation(Facts facts, List<Polynomial> equations) {}

  /**
   * The forms on a stratum.
   *
   * @param stratum with the leaves inside it
   * @param constants the chain of the algebraic numbers
   * @param meter ends the work early
   * @return empty if even the general point takes too long
   */
  public static Optional<FormSpaces> of(Strata.Stratum stratum, Chain constants, Meter meter) {
    Search search = new Search(stratum, constants, meter, new Tally(MOST_PRODUCTS));
    Task first = new Task(stratum.leaves().get(0).piece(), stratum.leaves().get(0).algebra());
    try {
      return Optional.of(search.from(search.at(first)));
    } catch (Tally.Reached e) {
      return Optional.empty();
    }
  }

  private record Task(Piece piece, BranchAlgebra algebra) {}

  /** What was found on one piece, and what must not vanish for the same to hold. */
  private record Found(
      Task task, InvariantForms<Polynomial> forms, Facts facts, List<Polynomial> watched) {}

  /** One stratum, asked piece by piece. */
  private record Search(Strata.Stratum stratum, Chain constants, Meter meter, Tally tally) {
    Found at(Task task) {
      meter.branch();
      BranchAlgebra algebra = task.algebra().on(task.piece().chain());
      StructureConstants<Polynomial> c = algebra.constants();
      InvariantForms<Polynomial> forms =
          InvariantForms.of(
              LieBracket.of(
                  new StructureConstants<>(
                      new Counted(KnownNonZero.on(task.piece()), tally),
                      c.dimension(),
                      c.brackets(),
                      c.denominator(),
                      c.scale())));
      List<Polynomial> watched = new ArrayList<>(forms.forms().nonVanishing());
      Facts facts = new Facts(forms.count(), nonDegenerate(forms, watched));
      return new Found(new Task(task.piece(), algebra), forms, facts, watched);
    }

    FormSpaces from(Found general) {
      Cutter cutter = new Cutter(constants, meter);
      SortedMap<String, List<Chain>> otherwise = new TreeMap<>();
      SortedMap<String, Facts> values = new TreeMap<>();
      Deque<Task> open = new ArrayDeque<>();
      stratum.leaves().stream().skip(1).forEach(l -> open.add(new Task(l.piece(), l.algebra())));
      boolean settled = cut(cutter, general, open);
      try {
        while (!open.isEmpty()) {
          Found f = at(open.poll());
          if (!f.facts.equals(general.facts)) {
            String key = f.facts.toString();
            otherwise.computeIfAbsent(key, k -> new ArrayList<>()).add(f.task.piece().chain());
            values.put(key, f.facts);
          }
          settled &= cut(cutter, f, open);
        }
      } catch (Tally.Reached e) {
        settled = false;
      }
      return new FormSpaces(
          general.facts,
          inBasis(general.task.algebra(), general.forms),
          general.task.piece().chain(),
          FormSpaces.deviations(stratum, otherwise, values, constants),
          settled);
    }

    /** Adds the pieces where something vanishes; false if that takes too long. */
    private static boolean cut(Cutter cutter, Found f, Deque<Task> open) {
      if (f.watched.stream().anyMatch(p -> p.termCount() > LONGEST_WATCHED)) {
        return false;
      }
      cutter
          .cut(f.task.piece(), f.watched)
          .cut()
          .forEach(q -> open.add(new Task(q, f.task.algebra())));
      return true;
    }
  }

  /** Whether one is not degenerate, with what must not vanish for that. */
  private static Existence nonDegenerate(
      InvariantForms<Polynomial> forms, List<Polynomial> watched) {
    MaximalRank greatest = forms.maximalRank();
    if (greatest.rank() < forms.dimension()) {
      return greatest.proved() ? Existence.NO : Existence.UNKNOWN;
    }
    Optional<NonDegenerateMember<Polynomial>> member =
        NonDegenerateMember.of(forms.forms().domain(), forms.dimension(), forms.matrices());
    member.ifPresent(m -> watched.addAll(m.nonVanishing()));
    return member.isPresent() ? Existence.YES : Existence.UNKNOWN;
  }

  /** From the basis y of the constants to the basis of the algebra (y_i = scale_i e_i). */
  private static List<List<SortedMap<Integer, Polynomial>>> inBasis(
      BranchAlgebra algebra, InvariantForms<Polynomial> forms) {
    Chain chain = (Chain) algebra.constants().domain();
    List<Polynomial> scale = algebra.constants().scale();
    return forms.matrices().stream().map(m -> scaled(chain, scale, m)).toList();
  }

  private static List<SortedMap<Integer, Polynomial>> scaled(
      Chain chain, List<Polynomial> scale, List<SortedMap<Integer, Polynomial>> matrix) {
    Polynomial common = chain.one();
    for (int i = 0; i < matrix.size(); i++) {
      for (int j : matrix.get(i).keySet()) {
        Polynomial d = scale.get(i).times(scale.get(j));
        common = common.times(d.over(common.gcd(d)));
      }
    }
    List<Polynomial> all = new ArrayList<>();
    for (int i = 0; i < matrix.size(); i++) {
      for (var e : matrix.get(i).entrySet()) {
        Polynomial d = scale.get(i).times(scale.get(e.getKey()));
        all.add(e.getValue().times(common.over(d)));
      }
    }
    List<Polynomial> normal = chain.normal(all).entries();
    boolean negative = normal.get(0).leadingCoefficient().signum() < 0;
    List<SortedMap<Integer, Polynomial>> out = new ArrayList<>();
    int at = 0;
    for (SortedMap<Integer, Polynomial> row : matrix) {
      SortedMap<Integer, Polynomial> kept = new TreeMap<>();
      for (int j : row.keySet()) {
        Polynomial p = normal.get(at++);
        kept.put(j, negative ? p.negate() : p);
      }
      out.add(kept);
    }
    return out;
  }

  private static List<Deviation> deviations(
      Strata.Stratum stratum,
      SortedMap<String, List<Chain>> found,
      SortedMap<String, Facts> values,
      Chain constants) {
    Closures closures = new Closures(constants);
    List<Deviation> out = new ArrayList<>();
    found.forEach(
        (key, chains) -> {
          for (Chain c : closures.maximal(chains)) {
            out.add(
                new Deviation(
                    values.get(key),
                    closures.ideal(c).stream()
                        .filter(q -> !stratum.closure().vanishes(q))
                        .toList()));
          }
        });
    out.sort(
        Comparator.comparing(
            e -> e.equations().stream().map(Polynomial::toString).collect(Collectors.joining())));
    return out;
  }
}
