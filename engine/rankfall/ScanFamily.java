package rankfall;

import java.math.BigInteger;
import java.util.Collection;
import java.util.HashMap;
import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.OptionalInt;
import java.util.Set;
import org.apache.commons.numbers.fraction.BigFraction;
import rankfall.Analysis.Findings;
import rankfall.exact.Polynomial;
import rankfall.exact.Rationals;
import rankfall.lie.Family;
import rankfall.lie.FamilyCondition;
import rankfall.lie.FamilyRelation;
import rankfall.lie.FamilySite;
import rankfall.lie.PointForm;
import rankfall.lie.RationalNumbers;
import rankfall.lie.SignRule;
import rankfall.lie.Span;
import rankfall.scan.Atlas;
import rankfall.scan.Axis;
import rankfall.scan.Finding;
import rankfall.scan.Frame;
import rankfall.scan.NumberSigns;
import rankfall.spec.Spec;
import rankfall.spec.SpecException;

/**
 * One family, made ready to be scanned.
 *
 * <p>Immutable; may be asked from several threads.
 */
public final class ScanFamily {
  private final Family family;
  private final PointNames names;

  private ScanFamily(Family family) {
    this.family = family;
    this.names = PointNames.of(family.ring());
  }

  /**
   * Makes a family ready.
   *
   * @param spec as read
   * @return the family
   * @throws SpecException if the spec describes no family
   */
  public static ScanFamily of(Spec spec) throws SpecException {
    return new ScanFamily(Family.of(spec));
  }

  /** The spec of the family. */
  public Spec spec() {
    return family.spec();
  }

  /** The names under which values may be given, in the order of the scan. */
  public List<String> names() {
    return names.all();
  }

  /**
   * Whether values under some names determine points.
   *
   * @param given the names
   * @return what is unknown or missing, one line; empty if they determine points
   */
  public Optional<String> misfit(Collection<String> given) {
    Optional<String> misfit = names.misfit(given);
    if (misfit.isPresent()) {
      return misfit;
    }
    return names.functions().entrySet().stream()
        .filter(f -> given.contains(f.getKey()))
        .flatMap(f -> f.getValue().stream().filter(given::contains))
        .findFirst()
        .map(f -> "'" + f + "' and its argument are both given; give one of them");
  }

  /**
   * Whether an axis holds values that cannot be taken: a parameter that is an argument of functions
   * may be 0 only.
   *
   * @param axis of one name
   * @return what is wrong, one line; empty if nothing is
   */
  public Optional<String> misfit(Axis axis) {
    return names.functions().containsKey(axis.name()) && axis.reach() != 0
        ? Optional.of(
            "functions of '"
                + axis.name()
                + "' are irrational but at 0; give values of "
                + String.join(" and ", names.functions().get(axis.name()))
                + " instead")
        : Optional.empty();
  }

  /**
   * What is prepared for points with values under some names.
   *
   * @param given names that fit, in the order of {@link #names}
   * @param analysis of the family, of any status; what it does not tell is computed point by point
   */
  public Atlas atlas(List<String> given, Analysis analysis) {
    Optional<Findings> findings = analysis.findings();
    boolean complete = analysis.status() == Analysis.Status.COMPLETE;
    return new Atlas(
        frame(given),
        family.poles(),
        family.relations().stream().map(FamilyRelation::polynomial).toList(),
        family.domain().stream().map(ScanFamily::condition).toList(),
        family.ring().complex(),
        complete ? findings.map(Findings::strata).orElse(List.of()) : List.of(),
        complete ? findings.map(Findings::regions).orElse(List.of()) : List.of());
  }

  private Frame frame(List<String> given) {
    Set<String> zeros = new HashSet<>();
    Set<String> ones = new HashSet<>();
    names
        .functions()
        .forEach(
            (argument, functions) -> {
              if (given.contains(argument)) {
                for (String f : functions) {
                  boolean one = f.startsWith("cos") || f.startsWith("exp");
                  (one ? ones : zeros).add(f);
                }
              }
            });
    return new Frame(given, zeros, ones, new Numbers(this));
  }

  /** The numbers of the family. */
  private record Numbers(ScanFamily family) implements NumberSigns {
    private static final int BITS = 60;
    private static final int LARGEST = 500;

    @Override
    public int sign(Polynomial number) {
      return family.sign(number);
    }

    @Override
    public OptionalDouble near(Polynomial number) {
      if (family.family.ring().complex()) {
        return OptionalDouble.empty();
      }
      BigFraction q = family.family.ring().tower().near(number, BITS).middle();
      BigInteger n = Rationals.numerator(q);
      BigInteger d = Rationals.denominator(q);
      int size = n.bitLength() - d.bitLength();
      if (Math.abs(size) > LARGEST - 1) {
        return OptionalDouble.empty();
      }
      // A whole number of more than BITS bits, rounded to a double and scaled back exactly.
      int shift = BITS + 2 - size;
      BigInteger whole = shift > 0 ? n.shiftLeft(shift).divide(d) : n.divide(d.shiftLeft(-shift));
      return OptionalDouble.of(Math.scalb(whole.doubleValue(), -shift));
    }
  }

  private int sign(Polynomial number) {
    if (family.ring().complex()) {
      return family.ring().constants().vanishes(number) ? 0 : 1;
    }
    return family.ring().tower().sign(number);
  }

  private static SignCondition condition(FamilyCondition c) {
    Comparison comparison =
        switch (c.relation()) {
          case EQUAL -> Comparison.EQUAL;
          case UNEQUAL -> Comparison.UNEQUAL;
          case LESS -> Comparison.LESS;
          case LESS_OR_EQUAL -> Comparison.NOT_GREATER;
          case GREATER -> Comparison.GREATER;
          case GREATER_OR_EQUAL -> Comparison.NOT_LESS;
        };
    return new SignCondition(c.polynomial(), comparison);
  }

  /**
   * The algebra at a point of the family, from the generators there.
   *
   * @param given names that fit
   * @param point exact values, one a name; no pole, on the relations and in the domain
   * @return dimension, rank and signature, or that there is no algebra
   * @throws IllegalArgumentException if it is no point of the family
   */
  public Finding at(List<String> given, List<BigFraction> point) {
    Map<String, BigFraction> values = new HashMap<>();
    for (int v = 0; v < given.size(); v++) {
      values.put(given.get(v), point.get(v));
    }
    FamilySite site = family.at(values);
    if (site instanceof FamilySite.Rational r) {
      return finding(Span.of(r.input()), new RationalNumbers());
    }
    if (site instanceof FamilySite.Algebraic a) {
      return finding(Span.of(a.input()), this::sign);
    }
    throw new IllegalArgumentException(((FamilySite.Outside) site).reason());
  }

  private <E> Finding finding(Span<E> span, SignRule<E> signs) {
    if (!(span instanceof Span.Closed<E> closed)) {
      return Finding.without(Finding.Status.OPEN);
    }
    PointForm form =
        family.ring().complex()
            ? PointForm.complex(closed.constants())
            : PointForm.real(closed.constants(), signs);
    return new Finding(
        Finding.Status.OK,
        OptionalInt.of(form.dimension()),
        OptionalInt.of(form.rank()),
        form.signature().map(x -> new Analysis.Signature(x.plus(), x.minus(), x.zero())),
        "",
        "",
        "",
        true);
  }
}
