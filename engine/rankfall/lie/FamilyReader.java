package rankfall.lie;

import java.util.ArrayList;
import java.util.Collection;
import java.util.Comparator;
import java.util.LinkedHashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.SortedMap;
import java.util.TreeMap;
import rankfall.exact.Factoring;
import rankfall.exact.Polynomial;
import rankfall.exact.RationalFunction;
import rankfall.spec.Diagnostic;
import rankfall.spec.Expression;
import rankfall.spec.Spec;
import rankfall.spec.SpecException;

/** Evaluates a spec, one part after the other; faults are collected over the whole of it. */
final class FamilyReader {
  private final Spec spec;
  private final FamilyRing ring;
  private final List<Diagnostic> faults;
  private final Set<Polynomial> divisors = new LinkedHashSet<>();
  private final Map<String, FamilyValue> abbreviations = new LinkedHashMap<>();

  private FamilyReader(Spec spec, FamilyRing ring, List<Diagnostic> faults) {
    this.spec = spec;
    this.ring = ring;
    this.faults = faults;
  }

  static Family read(Spec spec) throws SpecException {
    List<Diagnostic> faults = new ArrayList<>();
    FamilyRing ring;
    try {
      ring = FamilyRing.of(spec, FamilyScan.of(spec), faults);
    } catch (FamilyFault f) {
      throw new SpecException(List.of(f.in(spec)));
    }
    if (!faults.isEmpty()) {
      throw new SpecException(faults);
    }
    return new FamilyReader(spec, ring, faults).family();
  }

  static RationalFunction value(Spec spec, FamilyRing ring, Expression e) throws SpecException {
    List<Diagnostic> faults = new ArrayList<>();
    FamilyReader reader = new FamilyReader(spec, ring, faults);
    reader.readAbbreviations();
    Optional<RationalFunction> out =
        reader.attempt(
            () -> {
              FamilyValue v = reader.numbers().number(e);
              if (!v.number().isReal()) {
                throw new FamilyFault(e.place(), "a number that is not real");
              }
              return v.number().re();
            });
    if (out.isEmpty()) {
      throw new SpecException(faults);
    }
    return out.get();
  }

  private Family family() throws SpecException {
    readAbbreviations();
    List<FamilyRelation> relations = new ArrayList<>();
    List<FamilyCondition> domain = new ArrayList<>();
    FamilyConditions conditions = new FamilyConditions(ring, relations, domain);
    for (Spec.Condition c : spec.where()) {
      attempt(
          () -> {
            FamilyValue left = numbers().number(c.left());
            FamilyValue right = numbers().number(c.right());
            divisors.addAll(left.divisorsWith(right));
            conditions.add(c, left.number().plus(right.number().negate()));
            return true;
          });
    }
    conditions.addFunctions();
    FamilyBody body =
        spec.presentation() instanceof Spec.Matrices m
            ? matrices(m)
            : new FamilyBrackets(spec, ring, divisors, faults)
                .read((Spec.Brackets) spec.presentation(), abbreviations);
    if (!faults.isEmpty()) {
      faults.sort(
          Comparator.comparing((Diagnostic d) -> d.place().line())
              .thenComparing(d -> d.place().column()));
      throw new SpecException(faults);
    }
    return new Family(
        spec, ring, spec.presentation().generators(), body, relations, domain, poles());
  }

  private interface Step<T> {
    T run();
  }

  private <T> Optional<T> attempt(Step<T> step) {
    try {
      return Optional.of(step.run());
    } catch (FamilyFault f) {
      faults.add(f.in(spec));
      return Optional.empty();
    }
  }

  private FamilyExpressions numbers() {
    return new FamilyExpressions(ring, abbreviations, Map.of(), 0);
  }

  private void readAbbreviations() {
    for (Spec.Abbreviation a : spec.abbreviations()) {
      Optional<FamilyValue> v = attempt(() -> numbers().number(a.value()));
      abbreviations.put(
          a.name(), // a fault is on record; any number serves to look for more
          v.orElseGet(
              () ->
                  FamilyValue.of(
                      Gaussian.real(RationalFunction.of(Polynomial.one(ring.variables()))))));
    }
  }

  private FamilyBody matrices(Spec.Matrices m) {
    Map<String, SortedMap<Integer, Gaussian>> known = new LinkedHashMap<>();
    FamilyExpressions expressions = new FamilyExpressions(ring, abbreviations, known, m.order());
    List<FamilyBody.Entries> out = new ArrayList<>();
    for (Spec.NamedMatrix x : m.matrices()) {
      SortedMap<Integer, Gaussian> entries = entries(x.body(), m.order(), expressions);
      known.put(x.name(), entries);
      out.add(split(entries));
    }
    return new FamilyBody.Matrices(m.order(), m.closure() == Spec.Closure.GENERATE, out);
  }

  private SortedMap<Integer, Gaussian> entries(
      Spec.MatrixBody body, int order, FamilyExpressions expressions) {
    if (body instanceof Spec.Combination c) {
      return attempt(() -> expressions.combination(c.value(), "matrices"))
          .map(this::noted)
          .map(FamilyValue::vector)
          .orElseGet(TreeMap::new);
    }
    SortedMap<Integer, Gaussian> out = new TreeMap<>();
    List<List<Expression>> rows = ((Spec.Rows) body).entries();
    for (int r = 0; r < rows.size(); r++) {
      for (int c = 0; c < rows.get(r).size(); c++) {
        Expression e = rows.get(r).get(c);
        int at = r * order + c;
        attempt(() -> numbers().number(e))
            .map(this::noted)
            .map(FamilyValue::number)
            .filter(v -> !v.isZero())
            .ifPresent(v -> out.put(at, v));
      }
    }
    return out;
  }

  private FamilyValue noted(FamilyValue v) {
    divisors.addAll(v.divisors());
    return v;
  }

  /** Real and imaginary parts; of -i times the matrix for the Hermitian convention. */
  private FamilyBody.Entries split(SortedMap<Integer, Gaussian> entries) {
    SortedMap<Integer, RationalFunction> re = new TreeMap<>();
    SortedMap<Integer, RationalFunction> im = new TreeMap<>();
    entries.forEach(
        (k, v) -> {
          Gaussian g = v;
          if (spec.convention() == Spec.Convention.HERMITIAN) {
            g = ring.normal(v.times(ring.unit().negate()));
          }
          if (!g.re().isZero()) {
            re.put(k, g.re());
          }
          if (!g.im().isZero()) {
            im.put(k, g.im());
          }
        });
    return new FamilyBody.Entries(re, im);
  }

  private List<Polynomial> poles() {
    return divisors.stream()
        .filter(d -> !d.isConstant())
        .map(Factoring::irreducible)
        .flatMap(Collection::stream)
        .filter(p -> !ring.isNumber(p))
        .distinct()
        .sorted(Comparator.comparing(Polynomial::totalDegree).thenComparing(Polynomial::toString))
        .toList();
  }
}
