package rankfall;

import java.math.BigInteger;
import java.util.Collection;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalInt;
import java.util.function.Function;
import java.util.stream.Collectors;
import org.apache.commons.numbers.fraction.BigFraction;
import rankfall.exact.Chain;
import rankfall.exact.ChainFractions;
import rankfall.exact.Polynomial;
import rankfall.exact.Rationals;
import rankfall.identify.AlgebraNames;
import rankfall.identify.ExactAlgebra;
import rankfall.identify.TypeName;
import rankfall.lie.Family;
import rankfall.lie.FamilySite;
import rankfall.lie.PointAnalysis;
import rankfall.lie.PointFacts;
import rankfall.lie.RationalNumbers;
import rankfall.lie.Span;
import rankfall.spec.Spec;
import rankfall.spec.SpecException;

/**
 * One family, prepared once and asked at exact points.
 *
 * <p>Immutable; may be asked from several threads.
 */
public final class Points {
  private static final int MOST_NAMED = 3;

  private final Family family;
  private final PointNames names;
  private final StratumNames strata;

  private Points(Family family, StratumNames strata) {
    this.family = family;
    this.names = PointNames.of(family.ring());
    this.strata = strata;
  }

  /**
   * Prepares a family of which no strata are known.
   *
   * @param spec as read
   * @return the family, ready to be asked
   * @throws SpecException with every fault that shows when the expressions are evaluated
   */
  public static Points of(Spec spec) throws SpecException {
    return of(spec, StratumNames.NONE);
  }

  /**
   * Prepares a family.
   *
   * @param spec as read
   * @param strata names the strata of its points
   * @return the family, ready to be asked
   * @throws SpecException with every fault that shows when the expressions are evaluated
   */
  public static Points of(Spec spec, StratumNames strata) throws SpecException {
    return new Points(Family.of(spec), strata);
  }

  /** The name of the family. */
  public String family() {
    return family.spec().family();
  }

  /**
   * The names under which values may be given.
   *
   * @return the parameters, then functions of them such as {@code cos(t)}, in order
   */
  public List<String> names() {
    return names.all();
  }

  /**
   * Whether values under some names determine a point. A parameter that is an argument of functions
   * stands for all of them.
   *
   * @param given the names
   * @return what is unknown or missing, one line; empty if they determine a point
   */
  public Optional<String> misfit(Collection<String> given) {
    return names.misfit(given);
  }

  /**
   * All facts at one point.
   *
   * @param point exact values by name; a parameter that is an argument of functions may be given as
   *     0 only, elsewhere the values of the functions are given
   * @return the facts, or why there are none
   */
  public PointResult at(Map<String, BigFraction> point) {
    FamilySite site = family.at(point);
    if (site instanceof FamilySite.Outside outside) {
      return failure(point, OptionalInt.empty(), outside.reason());
    }
    if (site instanceof FamilySite.Rational rational) {
      return answer(point, Span.of(rational.input()), this::rational, this::exact);
    }
    FamilySite.Algebraic algebraic = (FamilySite.Algebraic) site;
    Chain chain = algebraic.chain();
    return answer(
        point,
        Span.of(algebraic.input()),
        closed -> algebraic(chain, closed),
        closed -> exact(chain, closed));
  }

  /**
   * The answer where values could not be read.
   *
   * @param texts the values as given, by name
   * @param error what is wrong with them, one line
   * @return a failure that says so
   */
  public PointResult unreadable(Map<String, String> texts, String error) {
    return new PointResult.Failure(
        family(), texts, family.names().size(), OptionalInt.empty(), error);
  }

  /** Says what an algebra over some ring is. */
  private interface Analyst<E> {
    PointFacts facts(Span.Closed<E> closed);
  }

  private <E> PointResult answer(
      Map<String, BigFraction> point,
      Span<E> span,
      Analyst<E> analyst,
      Function<Span.Closed<E>, ExactAlgebra> exact) {
    if (span instanceof Span.Closed<E> closed) {
      return facts(point, analyst.facts(closed), AlgebraNames.of(exact.apply(closed)));
    }
    Span.Open<E> open = (Span.Open<E>) span;
    return failure(point, OptionalInt.of(open.names().size()), missing(open));
  }

  private PointFacts rational(Span.Closed<BigInteger> closed) {
    RationalNumbers numbers = new RationalNumbers();
    int generators = family.names().size();
    return family.ring().complex()
        ? PointAnalysis.complex(closed.constants(), generators, numbers)
        : PointAnalysis.of(closed.constants(), generators, numbers, numbers);
  }

  private PointFacts algebraic(Chain chain, Span.Closed<Polynomial> closed) {
    int generators = family.names().size();
    return family.ring().complex()
        ? PointAnalysis.complex(closed.constants(), generators, (a, b) -> text(chain, a, b))
        : PointAnalysis.of(
            closed.constants(),
            generators,
            family.ring().tower()::sign,
            (a, b) -> text(chain, a, b));
  }

  private ExactAlgebra exact(Span.Closed<BigInteger> closed) {
    return family.ring().complex()
        ? ExactAlgebra.complex(closed.constants())
        : ExactAlgebra.real(closed.constants());
  }

  private ExactAlgebra exact(Chain chain, Span.Closed<Polynomial> closed) {
    return family.ring().complex()
        ? ExactAlgebra.complex(chain, closed.constants())
        : ExactAlgebra.real(chain, closed.constants(), family.ring().tower()::sign);
  }

  private static String text(Chain chain, Polynomial above, Polynomial below) {
    return ChainFractions.canonical(chain, above, below).toString();
  }

  private PointResult facts(Map<String, BigFraction> point, PointFacts f, Optional<TypeName> name) {
    return new PointResult.Facts(
        family(),
        texts(point),
        f.generators(),
        f.dimension(),
        new PointResult.Killing(
            f.killing().rank(),
            f.killing().signature().map(s -> new Analysis.Signature(s.plus(), s.minus(), s.zero())),
            f.killing().determinant(),
            f.killing().matrix()),
        f.derivedSeries(),
        f.lowerCentralSeries(),
        f.centre(),
        f.radical(),
        f.nilradical(),
        f.unimodular(),
        new PointResult.InvariantForms(
            f.invariantForms().dimension(),
            f.invariantForms().maximalRank().rank(),
            f.invariantForms().maximalRank().proved()),
        f.abelian(),
        f.nilpotent(),
        f.solvable(),
        f.semisimple(),
        f.reductive(),
        f.compact(),
        strata.of(point),
        name.map(n -> new AlgebraType(n.name(), n.otherNames(), true)));
  }

  private PointResult failure(Map<String, BigFraction> point, OptionalInt dimension, String error) {
    return new PointResult.Failure(family(), texts(point), family.names().size(), dimension, error);
  }

  /** The values in the order of the family. */
  private Map<String, String> texts(Map<String, BigFraction> point) {
    Map<String, String> out = new LinkedHashMap<>();
    for (String name : names.all()) {
      if (point.containsKey(name)) {
        out.put(name, Rationals.text(point.get(name)));
      }
    }
    return out;
  }

  private static <E> String missing(Span.Open<E> open) {
    boolean jacobi = open.missing().get(0).generators().size() == 3;
    String listed =
        open.missing().stream()
            .limit(MOST_NAMED)
            .map(m -> m.generators().stream().map(open.names()::get).collect(joined(jacobi)))
            .collect(Collectors.joining(", "));
    int more = open.missing().size() - MOST_NAMED;
    String all = more > 0 ? listed + " and " + more + " more" : listed;
    if (jacobi) {
      return "Jacobi's identity fails for " + all;
    }
    return "the span is not closed: "
        + all
        + (open.missing().size() == 1 ? " leaves" : " leave")
        + " it";
  }

  private static java.util.stream.Collector<CharSequence, ?, String> joined(boolean jacobi) {
    return jacobi ? Collectors.joining(", ", "(", ")") : Collectors.joining(", ", "[", "]");
  }
}
