package rankfall;

import java.math.BigInteger;
import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.SortedMap;
import java.util.TreeMap;
import java.util.stream.IntStream;
import org.apache.commons.numbers.fraction.BigFraction;
import rankfall.Analysis.MatrixEntry;
import rankfall.Analysis.Quotient;
import rankfall.Forms.Existence;
import rankfall.Forms.Extent;
import rankfall.Forms.FormDeviation;
import rankfall.Forms.InvariantForms;
import rankfall.Forms.InverseMember;
import rankfall.exact.AlgebraicNumber;
import rankfall.exact.Chain;
import rankfall.exact.ExtendedChain;
import rankfall.exact.Polynomial;
import rankfall.exact.RationalFunction;
import rankfall.lie.DualForm;
import rankfall.lie.Family;
import rankfall.lie.FamilySite;
import rankfall.lie.GeneralForm;
import rankfall.lie.LieBracket;
import rankfall.lie.NonDegenerateMember;
import rankfall.lie.Span;
import rankfall.locus.FormSpaces;
import rankfall.locus.Meter;
import rankfall.locus.Profile;
import rankfall.locus.Strata;

/** The invariant forms of the strata of a family. */
record InvariantFormFindings(Family family, Meter meter) {
  /** Most forms that are listed, and most entries of all of them. */
  private static final int MOST_FORMS = 10;

  private static final int MOST_ENTRIES = 90;

  /** Largest order of a matrix whose inverse is written out, and its longest entry, in terms. */
  private static final int LARGEST_INVERSE = 10;

  private static final int LONGEST_ENTRY = 12;

  /** Most forms of which the inverse of the general member is given. */
  private static final int GENERAL_INVERSE = 2;

  /**
   * The forms of a stratum.
   *
   * @param stratum with its leaves
   * @param point a real point of it; may be empty
   * @throws Meter.Exhausted if the budget is used up
   */
  InvariantForms of(Strata.Stratum stratum, List<AlgebraicNumber> point) {
    Profile p = stratum.profile();
    int n = p.dimension();
    if (p.derived() == 0) {
      return summary(n * (n + 1) / 2, Extent.ABELIAN);
    }
    if (p.rank() == n) {
      return summary(
          atPoint(point)
              .orElseGet(
                  () ->
                      rankfall.lie.InvariantForms.of(
                              LieBracket.of(stratum.leaves().get(0).algebra().constants()))
                          .count()),
          Extent.SEMISIMPLE);
    }
    return FormSpaces.of(stratum, family.ring().constants(), meter)
        .map(spaces -> listed(spaces, n))
        .orElseGet(() -> summary(0, Extent.UNDECIDED));
  }

  private static InvariantForms summary(int dimension, Extent extent) {
    return new InvariantForms(
        dimension,
        extent == Extent.UNDECIDED ? Existence.UNKNOWN : Existence.YES,
        extent,
        List.of(),
        List.of(),
        Optional.empty(),
        Optional.empty(),
        List.of(),
        extent != Extent.UNDECIDED);
  }

  /**
   * The number of forms at one rational point. On an irreducible set of semisimple algebras it is
   * the same at all points: it counts the simple ideals over the complex numbers, and these
   * algebras are rigid (Nijenhuis and Richardson 1967, Deformations of Lie algebra structures, J.
   * Math. Mech. 17, 89).
   */
  private Optional<Integer> atPoint(List<AlgebraicNumber> point) {
    Map<String, BigFraction> values = new TreeMap<>();
    int parameters = family.ring().variables().indeterminates();
    if (point.size() < parameters) {
      return Optional.empty();
    }
    for (int v = 0; v < parameters; v++) {
      Optional<BigFraction> value = point.get(v).rational();
      if (value.isEmpty()) {
        return Optional.empty();
      }
      values.put(family.ring().variables().names().get(v), value.get());
    }
    FamilySite site = family.at(values);
    if (site instanceof FamilySite.Rational r
        && Span.of(r.input()) instanceof Span.Closed<BigInteger> c) {
      return Optional.of(rankfall.lie.InvariantForms.of(LieBracket.of(c.constants())).count());
    }
    if (site instanceof FamilySite.Algebraic a
        && Span.of(a.input()) instanceof Span.Closed<Polynomial> c) {
      return Optional.of(rankfall.lie.InvariantForms.of(LieBracket.of(c.constants())).count());
    }
    return Optional.empty();
  }

  private InvariantForms listed(FormSpaces spaces, int n) {
    int k = spaces.general().dimension();
    List<FormDeviation> deviations =
        spaces.deviations().stream()
            .map(
                d ->
                    new FormDeviation(
                        d.equations(), d.facts().dimension(), existence(d.facts().nonDegenerate())))
            .toList();
    int entries =
        spaces.basis().stream().mapToInt(b -> b.stream().mapToInt(SortedMap::size).sum()).sum();
    boolean isShort = k > 0 && k <= MOST_FORMS && entries <= MOST_ENTRIES;
    if (!isShort) {
      return new InvariantForms(
          k,
          existence(spaces.general().nonDegenerate()),
          k == 0 ? Extent.LISTED : Extent.LONG,
          List.of(),
          List.of(),
          Optional.empty(),
          Optional.empty(),
          deviations,
          spaces.settled());
    }
    List<String> names = coefficients(k);
    GeneralForm general =
        GeneralForm.of(ExtendedChain.of(spaces.chain(), names), names, n, spaces.basis());
    boolean regular = spaces.general().nonDegenerate() == FormSpaces.Existence.YES;
    return new InvariantForms(
        k,
        existence(spaces.general().nonDegenerate()),
        Extent.LISTED,
        names,
        spaces.basis().stream().map(InvariantFormFindings::entries).toList(),
        regular && general.isShort()
            ? general.determinant().map(d -> new Quotient(d.numerator(), d.denominator()))
            : Optional.empty(),
        regular && n <= LARGEST_INVERSE ? inverse(general, spaces, n) : Optional.empty(),
        deviations,
        spaces.settled());
  }

  private static Existence existence(FormSpaces.Existence e) {
    return Existence.valueOf(e.name());
  }

  /** Names that no variable of the family has. */
  private List<String> coefficients(int count) {
    List<String> taken = new ArrayList<>(family.ring().variables().names());
    taken.addAll(family.ring().parameters());
    taken.addAll(family.names());
    for (String letter : List.of("c", "k", "u", "w", "c_")) {
      List<String> names = IntStream.rangeClosed(1, count).mapToObj(i -> letter + i).toList();
      if (Collections.disjoint(names, taken)) {
        return names;
      }
    }
    return IntStream.rangeClosed(1, count).mapToObj(i -> "c__" + i).toList();
  }

  private static List<MatrixEntry> entries(List<SortedMap<Integer, Polynomial>> matrix) {
    List<MatrixEntry> out = new ArrayList<>();
    for (int i = 0; i < matrix.size(); i++) {
      int row = i;
      matrix
          .get(i)
          .tailMap(i)
          .forEach((j, p) -> out.add(new MatrixEntry(row, j, RationalFunction.of(p))));
    }
    return out;
  }

  private static Optional<InverseMember> inverse(GeneralForm general, FormSpaces spaces, int n) {
    if (spaces.basis().size() <= GENERAL_INVERSE) {
      Optional<InverseMember> all = general.inverse().flatMap(d -> readable(List.of(), d));
      if (all.isPresent()) {
        return all;
      }
    }
    return NonDegenerateMember.of(spaces.chain(), n, spaces.basis())
        .flatMap(
            m ->
                DualForm.of(spaces.chain(), member(spaces, m.weights(), n))
                    .flatMap(d -> readable(m.weights(), d)));
  }

  private static Optional<InverseMember> readable(List<Integer> weights, DualForm inverse) {
    List<MatrixEntry> out = new ArrayList<>();
    for (int i = 0; i < inverse.matrix().size(); i++) {
      for (int j = i; j < inverse.matrix().size(); j++) {
        RationalFunction f = inverse.matrix().get(i).get(j);
        if (f.numerator().termCount() > LONGEST_ENTRY
            || f.denominator().termCount() > LONGEST_ENTRY) {
          return Optional.empty();
        }
        if (!f.isZero()) {
          out.add(new MatrixEntry(i, j, f));
        }
      }
    }
    return Optional.of(new InverseMember(weights, out));
  }

  private static List<List<RationalFunction>> member(
      FormSpaces spaces, List<Integer> weights, int n) {
    Chain chain = spaces.chain();
    List<List<RationalFunction>> out = new ArrayList<>();
    for (int i = 0; i < n; i++) {
      List<RationalFunction> row = new ArrayList<>();
      for (int j = 0; j < n; j++) {
        Polynomial sum = chain.zero();
        for (int k = 0; k < weights.size(); k++) {
          Polynomial entry = spaces.basis().get(k).get(i).get(j);
          if (entry != null) {
            sum = sum.plus(entry.times(BigInteger.valueOf(weights.get(k))));
          }
        }
        row.add(RationalFunction.of(sum));
      }
      out.add(row);
    }
    return out;
  }
}
