package rankfall;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import rankfall.exact.ChainFactoring;
import rankfall.exact.GroebnerBasis;
import rankfall.exact.Polynomial;
import rankfall.exact.RationalFunction;
import rankfall.exact.RealZeros;
import rankfall.identify.TypeLoci;
import rankfall.lie.Family;
import rankfall.locus.Meter;
import rankfall.locus.RealPoints;
import rankfall.locus.Regions;
import rankfall.locus.Strata;

/**
 * The parts of a stratum that have names of their own.
 *
 * @param parts with real points, the general one first
 */
record NamedParts(Family family, Strata.Stratum stratum, List<NamedPart> parts) {
  NamedParts {
    parts = List.copyOf(parts);
  }

  /**
   * Cuts a stratum where names change.
   *
   * @throws Meter.Exhausted if the budget is used up
   */
  static NamedParts of(Family family, Strata.Stratum stratum, Meter meter) {
    List<TypeLoci.Locus> loci = TypeLoci.of(stratum, family.ring().constants(), meter).loci();
    NamedPart general = NamedPart.of(family, stratum, loci.get(0), meter);
    Optional<String> everywhere = general.onlyName();
    List<NamedPart> others = new ArrayList<>();
    TypeLoci.Locus rest = loci.get(0);
    for (TypeLoci.Locus l : loci.subList(1, loci.size())) {
      NamedPart part = NamedPart.of(family, stratum, l, meter);
      boolean same = everywhere.isPresent() && everywhere.equals(part.onlyName());
      if (!part.isEmpty() && !same) {
        others.add(part);
      } else {
        rest = rest.including(l);
      }
    }
    List<NamedPart> all = new ArrayList<>();
    all.add(rest == loci.get(0) ? general : NamedPart.of(family, stratum, rest, meter));
    all.addAll(others);
    return new NamedParts(family, stratum, all.stream().filter(p -> !p.isEmpty()).toList());
  }

  /**
   * What holds in a row: what cuts the part out of the stratum, and the signs. A set that is left
   * out and has no single equation is left out by the sum of the squares of its equations.
   *
   * @param part one of these
   * @param row of that part
   */
  List<SignCondition> conditions(NamedPart part, Regions.Row row) {
    List<SignCondition> out = new ArrayList<>();
    part.locus().equations().forEach(p -> out.add(new SignCondition(p, Comparison.EQUAL)));
    for (Regions.Condition c : row.conditions()) {
      out.add(
          new SignCondition(c.polynomial(), c.sign() > 0 ? Comparison.GREATER : Comparison.LESS));
    }
    for (List<Polynomial> e : part.locus().exclusions()) {
      if (meets(part, row, e)) {
        out.add(apart(e));
      }
    }
    return out;
  }

  private static SignCondition apart(List<Polynomial> equations) {
    if (equations.size() == 1) {
      return new SignCondition(equations.get(0), Comparison.UNEQUAL);
    }
    Polynomial squares =
        equations.stream().map(p -> p.pow(2)).reduce(Polynomial::plus).orElseThrow();
    return new SignCondition(squares.primitive(), Comparison.GREATER);
  }

  /** Whether the signs of the row do not already leave a set out. */
  private boolean meets(NamedPart part, Regions.Row row, List<Polynomial> set) {
    for (Regions.Condition c : row.conditions()) {
      List<Polynomial> factors =
          ChainFactoring.irreducible(family.ring().constants(), c.polynomial());
      if (set.stream().anyMatch(factors::contains)) {
        return false;
      }
    }
    List<Polynomial> equations = new ArrayList<>(part.equations());
    equations.addAll(set);
    if (row.conditions().stream().anyMatch(c -> failsOn(equations, c))) {
      return false;
    }
    List<RealZeros.Condition> signs =
        row.conditions().stream()
            .map(c -> positive(c.sign() > 0 ? c.polynomial() : c.polynomial().negate()))
            .toList();
    return new RealPoints(family).under(equations, signs).verdict() != RealZeros.Verdict.NO;
  }

  /** Whether what the equations leave of a polynomial never has the sign. */
  private boolean failsOn(List<Polynomial> equations, Regions.Condition c) {
    GroebnerBasis bases = new GroebnerBasis(family.ring().constants());
    RationalFunction rest = bases.normalForm(bases.reduced(equations), c.polynomial());
    Polynomial p = c.sign() > 0 ? rest.numerator() : rest.numerator().negate();
    return p.isZero()
        || new RealPoints(family).under(List.of(), List.of(positive(p))).verdict()
            == RealZeros.Verdict.NO;
  }

  private static RealZeros.Condition positive(Polynomial p) {
    return new RealZeros.Condition(p, RealZeros.Relation.POSITIVE);
  }
}
