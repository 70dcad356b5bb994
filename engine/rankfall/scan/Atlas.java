package rankfall.scan;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalInt;
import rankfall.AlgebraType;
import rankfall.Analysis.Region;
import rankfall.Analysis.Signature;
import rankfall.Analysis.Stratum;
import rankfall.Comparison;
import rankfall.SignCondition;
import rankfall.exact.Polynomial;
import rankfall.scan.Finding.Status;

/**
 * Tells from the signs of prepared polynomials where a point lies.
 *
 * <p>A point of the family that satisfies the equations of a stratum and is in none of its
 * exclusions lies in that stratum and no other; a point in no stratum has no algebra. On a stratum
 * the rank is constant, so that the signature is constant on connected pieces. The regions are open
 * in the stratum and together dense in the part of it that the spec's conditions leave. Let p be a
 * point of the stratum at which its closure is a manifold of full dimension (the equations are
 * independent there to first order), and let no condition of the spec be an equality at p. Then
 * every neighbourhood of p meets some region; such a region has p in its closure, so that p
 * satisfies its conditions with {@code <=} in place of {@code <}; and p has the signature of that
 * region. If p satisfies the strict conditions of one region, a neighbourhood does, and since
 * regions are disjoint that region is the one. Else, if all regions whose conditions p satisfies in
 * the weak sense have one signature, it is that of p. At any other point the signature is asked
 * for, and never concluded.
 */
public final class Atlas {
  private final Frame frame;
  private final List<Polynomial> polynomials = new ArrayList<>();
  private final Map<Polynomial, Integer> places = new LinkedHashMap<>();
  private final List<Test> poles;
  private final List<Test> relations;
  private final List<Test> domain;
  private final boolean prepared;
  private final boolean complex;
  private final List<Sheet> sheets = new ArrayList<>();

  /**
   * What is prepared.
   *
   * @param frame what the variables are
   * @param poles polynomials at whose zeros the family is undefined
   * @param relations polynomials that vanish at all points of the family
   * @param domain conditions on the points of the family
   * @param complex whether there are no signatures
   * @param strata all of them, in order; empty where not everything was decided
   * @param regions all of them
   */
  public Atlas(
      Frame frame,
      List<Polynomial> poles,
      List<Polynomial> relations,
      List<SignCondition> domain,
      boolean complex,
      List<Stratum> strata,
      List<Region> regions) {
    this.frame = frame;
    this.poles = poles.stream().map(p -> test(p, Comparison.UNEQUAL)).toList();
    this.relations = relations.stream().map(p -> test(p, Comparison.EQUAL)).toList();
    this.domain = domain.stream().map(c -> test(c.polynomial(), c.comparison())).toList();
    this.complex = complex;
    this.prepared = !strata.isEmpty();
    for (Stratum s : strata) {
      sheets.add(sheet(s, regions.stream().filter(r -> r.stratum().equals(s.name())).toList()));
    }
  }

  /** A condition on the sign of a numbered polynomial. */
  private record Test(int polynomial, boolean reversed, Comparison comparison) {
    int sign(Signs at) {
      int s = at.sign(polynomial);
      return reversed ? -s : s;
    }

    boolean holds(Signs at) {
      return comparison.holds(sign(at));
    }

    /** Whether the set where it holds is open. */
    boolean isStrict() {
      return comparison == Comparison.GREATER
          || comparison == Comparison.LESS
          || comparison == Comparison.UNEQUAL;
    }

    /** Whether it holds in the closure of the set where it holds. */
    boolean holdsWeakly(Signs at) {
      return switch (comparison) {
        case EQUAL -> sign(at) == 0;
        case UNEQUAL -> true;
        case GREATER, NOT_LESS -> sign(at) >= 0;
        case LESS, NOT_GREATER -> sign(at) <= 0;
      };
    }
  }

  /**
   * A region as it is looked up.
   *
   * @param proved whether its type is that of all its points
   */
  private record Part(
      String name, List<Test> tests, Signature signature, String type, boolean proved) {}

  /**
   * A stratum as it is looked up.
   *
   * @param minors one of them is not 0 where the closure is a manifold; empty if it is everywhere
   * @param parts its regions; empty where some are not established exactly
   */
  private record Sheet(
      Stratum stratum,
      List<Test> equations,
      List<List<Test>> exclusions,
      boolean smooth,
      List<Test> minors,
      List<Part> parts,
      boolean exact) {}

  private Test test(Polynomial p, Comparison comparison) {
    Polynomial q = p.primitive();
    boolean reversed = !p.isZero() && p.leadingCoefficient().signum() < 0;
    Integer known = places.get(q);
    if (known == null) {
      known = polynomials.size();
      polynomials.add(q);
      places.put(q, known);
    }
    return new Test(known, reversed, comparison);
  }

  private List<Test> zeros(List<Polynomial> equations) {
    return equations.stream().map(p -> test(p, Comparison.EQUAL)).toList();
  }

  private Sheet sheet(Stratum s, List<Region> regions) {
    Smoothness smoothness = Smoothness.of(s.equations(), s.codimension());
    return new Sheet(
        s,
        zeros(s.equations()),
        s.exclusions().stream().map(this::zeros).toList(),
        smoothness.everywhere(),
        smoothness.minors().stream().map(p -> test(p, Comparison.UNEQUAL)).toList(),
        regions.stream().map(this::part).toList(),
        !regions.isEmpty() && regions.stream().allMatch(Region::exact));
  }

  private Part part(Region r) {
    return new Part(
        r.name(),
        r.conditions().stream().map(c -> test(c.polynomial(), c.comparison())).toList(),
        r.signature(),
        r.type().map(AlgebraType::text).orElse(""),
        r.type().map(AlgebraType::everywhere).orElse(false));
  }

  /** What the variables are. */
  Frame frame() {
    return frame;
  }

  /** The polynomials whose signs are asked, by their numbers. */
  List<Polynomial> polynomials() {
    return List.copyOf(polynomials);
  }

  /**
   * Decides from signs; asks as few as it needs, and which one next depends on the answers alone.
   */
  Decision decide(Signs at) {
    if (poles.stream().anyMatch(t -> !t.holds(at))) {
      return new Decision.Known(Finding.without(Status.POLE));
    }
    if (relations.stream().anyMatch(t -> !t.holds(at))) {
      return new Decision.Known(Finding.without(Status.OFF));
    }
    if (domain.stream().anyMatch(t -> !t.holds(at))) {
      return new Decision.Known(Finding.without(Status.OUTSIDE));
    }
    if (!prepared) {
      return Decision.Ask.UNPREPARED;
    }
    for (Sheet s : sheets) {
      if (all(s.equations, at) && s.exclusions.stream().noneMatch(e -> all(e, at))) {
        return within(s, at);
      }
    }
    return new Decision.Known(Finding.without(Status.OPEN));
  }

  private static boolean all(List<Test> tests, Signs at) {
    return tests.stream().allMatch(t -> t.holds(at));
  }

  private Decision within(Sheet s, Signs at) {
    List<Part> weak =
        s.parts.stream().filter(p -> p.tests.stream().allMatch(t -> t.holdsWeakly(at))).toList();
    List<Part> inside = weak.stream().filter(p -> all(p.tests, at)).toList();
    String region = inside.size() == 1 ? inside.get(0).name : "";
    boolean open = inside.size() == 1 && inside.get(0).tests.stream().allMatch(Test::isStrict);
    Optional<Signature> signature =
        complex ? Optional.empty() : signature(s, open ? inside : weak, at);
    String type = inside.size() == 1 ? inside.get(0).type : between(s, weak, signature.isPresent());
    if (!complex && signature.isEmpty()) {
      return new Decision.Ask(
          s.stratum.name(),
          region,
          type,
          inside.size() == 1 ? Optional.of(inside.get(0).signature) : Optional.empty(),
          s.stratum.dimension(),
          s.stratum.rank());
    }
    return new Decision.Known(
        new Finding(
            Status.OK,
            OptionalInt.of(s.stratum.dimension()),
            OptionalInt.of(s.stratum.rank()),
            signature,
            s.stratum.name(),
            region,
            type,
            false));
  }

  /**
   * The algebra at a point in no region. Semisimple algebras are rigid (Nijenhuis and Richardson,
   * Bull. Amer. Math. Soc. 73 (1967) 175): those near a point are isomorphic to the one there. So
   * if regions are near and all that may be have one proved name, it is the name at the point.
   * Other algebras are left without one. Over complex ground a stratum has its own.
   *
   * @param conclusive whether some region is near
   */
  private String between(Sheet s, List<Part> weak, boolean conclusive) {
    if (complex) {
      return s.stratum.type().orElse("");
    }
    boolean semisimple = s.stratum.dimension() > 0 && s.stratum.rank() == s.stratum.dimension();
    boolean one = weak.stream().map(Part::type).distinct().count() == 1;
    boolean proved = weak.stream().allMatch(Part::proved);
    return conclusive && semisimple && one && proved ? weak.get(0).type : "";
  }

  /** The signature, where it follows from the regions near; see the description of the class. */
  private Optional<Signature> signature(Sheet s, List<Part> near, Signs at) {
    if (s.stratum.rank() == 0) {
      return Optional.of(new Signature(0, 0, s.stratum.dimension()));
    }
    boolean oneSignature = near.stream().map(Part::signature).distinct().count() == 1;
    boolean conclusive =
        s.exact
            && oneSignature
            && (s.smooth || s.minors.stream().anyMatch(t -> t.holds(at)))
            && domain.stream().noneMatch(t -> t.sign(at) == 0);
    return conclusive ? Optional.of(near.get(0).signature) : Optional.empty();
  }
}
