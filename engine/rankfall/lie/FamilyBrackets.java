package rankfall.lie;

import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.SortedMap;
import java.util.TreeMap;
import rankfall.exact.Polynomial;
import rankfall.exact.RationalFunction;
import rankfall.lie.StructureConstants.Pair;
import rankfall.spec.Diagnostic;
import rankfall.spec.Spec;
import rankfall.spec.Spec.BracketEquation;

/**
 * Reads the table of brackets.
 *
 * @param spec the spec
 * @param ring of the family
 * @param divisors by what was divided, added to
 * @param faults what is wrong, added to
 */
record FamilyBrackets(
    Spec spec, FamilyRing ring, Set<Polynomial> divisors, List<Diagnostic> faults) {

  /** An equation with its value, left before right. */
  private record Known(BracketEquation equation, SortedMap<Integer, RationalFunction> value) {}

  FamilyBody.Brackets read(Spec.Brackets brackets, Map<String, FamilyValue> abbreviations) {
    Map<String, SortedMap<Integer, Gaussian>> vectors = new LinkedHashMap<>();
    for (int k = 0; k < brackets.generators().size(); k++) {
      SortedMap<Integer, Gaussian> unit = new TreeMap<>();
      unit.put(k, Gaussian.real(RationalFunction.of(Polynomial.one(ring.variables()))));
      vectors.put(brackets.generators().get(k), unit);
    }
    FamilyExpressions expressions = new FamilyExpressions(ring, abbreviations, vectors, 0);
    SortedMap<Pair, Known> known = new TreeMap<>();
    for (BracketEquation e : brackets.equations()) {
      try {
        FamilyValue v = expressions.combination(e.value(), "generators");
        divisors.addAll(v.divisors());
        add(known, e, brackets.generators(), real(e, v));
      } catch (FamilyFault f) {
        faults.add(f.in(spec));
      }
    }
    SortedMap<Pair, SortedMap<Integer, RationalFunction>> table = new TreeMap<>();
    known.forEach(
        (p, k) -> {
          if (!k.value.isEmpty()) {
            table.put(p, k.value);
          }
        });
    return new FamilyBody.Brackets(table);
  }

  /** The coefficients, with the factor -i of the Hermitian convention; they must be real. */
  private SortedMap<Integer, RationalFunction> real(BracketEquation e, FamilyValue v) {
    boolean hermitian = spec.convention() == Spec.Convention.HERMITIAN;
    SortedMap<Integer, RationalFunction> out = new TreeMap<>();
    v.vector()
        .forEach(
            (k, c) -> {
              Gaussian g = hermitian ? ring.normal(c.times(ring.unit().negate())) : c;
              if (!g.isReal()) {
                throw new FamilyFault(
                    e.place(),
                    "a real algebra with a non-real structure constant",
                    hermitian
                        ? "with the Hermitian convention right-hand sides carry the factor i"
                        : "leave i out, use the Hermitian convention, or a complex ground");
              }
              out.put(k, g.re());
            });
    return out;
  }

  private void add(
      SortedMap<Pair, Known> known,
      BracketEquation e,
      List<String> generators,
      SortedMap<Integer, RationalFunction> value) {
    int i = generators.indexOf(e.left());
    int j = generators.indexOf(e.right());
    if (i == j) {
      if (!value.isEmpty()) {
        throw new FamilyFault(
            e.place(), "the bracket of " + e.left() + " with itself is not 0", "it is 0 always");
      }
      return;
    }
    SortedMap<Integer, RationalFunction> oriented = new TreeMap<>(value);
    if (i > j) {
      oriented.replaceAll((k, v) -> v.negate());
    }
    Pair pair = new Pair(Math.min(i, j), Math.max(i, j));
    Known before = known.putIfAbsent(pair, new Known(e, oriented));
    if (before != null && !equal(before.value, oriented)) {
      throw new FamilyFault(
          e.place(),
          "["
              + e.left()
              + ", "
              + e.right()
              + "] is given twice with different values, first at "
              + before.equation.place().line()
              + ":"
              + before.equation.place().column(),
          "keep one of them");
    }
  }

  private boolean equal(
      SortedMap<Integer, RationalFunction> a, SortedMap<Integer, RationalFunction> b) {
    return a.keySet().equals(b.keySet())
        && a.keySet().stream().allMatch(k -> ring.normal(a.get(k).minus(b.get(k))).isZero());
  }
}
