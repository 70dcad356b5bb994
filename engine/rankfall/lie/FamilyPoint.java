package rankfall.lie;

import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.TreeMap;
import org.apache.commons.numbers.fraction.BigFraction;
import rankfall.exact.Chain;
import rankfall.exact.Polynomial;
import rankfall.exact.RationalFunction;

/**
 * A rational point, completed to all variables that are no algebraic numbers.
 *
 * @param ring of the family
 * @param values a value a variable; empty for algebraic numbers
 * @param reason why it is no point
 */
record FamilyPoint(FamilyRing ring, List<Optional<BigFraction>> values, Optional<String> reason) {

  static FamilyPoint of(FamilyRing ring, Map<String, BigFraction> given) {
    Map<String, BigFraction> known = new TreeMap<>();
    List<Integer> numbers = ring.constants().rules().stream().map(Chain.Rule::variable).toList();
    for (Map.Entry<String, BigFraction> e : new TreeMap<>(given).entrySet()) {
      String name = e.getKey();
      boolean variable = ring.variables().names().contains(name);
      boolean argument = ring.arguments().containsKey(name);
      if ((variable && numbers.contains(ring.variables().index(name)))
          || ring.values().containsKey(name)) {
        return no(ring, "'" + name + "' is an algebraic number and takes no value");
      }
      if (!variable && !argument) {
        return no(ring, "'" + name + "' is no coordinate; they are " + coordinates(ring, numbers));
      }
      if (argument) {
        Optional<String> fault = addFunctions(ring, name, e.getValue(), given, known);
        if (fault.isPresent()) {
          return no(ring, fault.get());
        }
      }
      if (variable) {
        known.put(name, e.getValue());
      }
    }
    List<Optional<BigFraction>> values = new ArrayList<>();
    for (int v = 0; v < ring.variables().count(); v++) {
      String name = ring.variables().names().get(v);
      if (!numbers.contains(v) && !known.containsKey(name)) {
        return no(ring, "no value is given for " + name);
      }
      values.add(Optional.ofNullable(known.get(name)));
    }
    return new FamilyPoint(ring, List.copyOf(values), Optional.empty());
  }

  private static FamilyPoint no(FamilyRing ring, String reason) {
    return new FamilyPoint(
        ring, Collections.nCopies(ring.variables().count(), Optional.empty()), Optional.of(reason));
  }

  private static String coordinates(FamilyRing ring, List<Integer> numbers) {
    List<String> out = new ArrayList<>(ring.variables().names());
    numbers.stream().sorted(Collections.reverseOrder()).forEach(v -> out.remove(v.intValue()));
    return out.isEmpty() ? "none" : String.join(", ", out);
  }

  /** The functions of a parameter at 0; elsewhere they must be given themselves. */
  private static Optional<String> addFunctions(
      FamilyRing ring,
      String parameter,
      BigFraction value,
      Map<String, BigFraction> given,
      Map<String, BigFraction> known) {
    for (FamilyRing.Coordinates kind : ring.arguments().get(parameter)) {
      List<String> names = FamilyRing.coordinates(kind, parameter);
      if (value.signum() != 0) {
        return Optional.of(
            names.get(0)
                + " is irrational at "
                + parameter
                + " = "
                + RationalFunction.of(ring.variables(), value)
                + "; give values of "
                + String.join(" and ", names)
                + " instead of "
                + parameter);
      }
      for (int k = 0; k < names.size(); k++) {
        BigFraction at = k == 0 ? BigFraction.ONE : BigFraction.ZERO;
        if (!given.getOrDefault(names.get(k), at).equals(at)) {
          return Optional.of(names.get(k) + " has another value at " + parameter + " = 0");
        }
        known.put(names.get(k), at);
      }
    }
    return Optional.empty();
  }

  /** Why the point does not belong to the family, if so. */
  Optional<String> outside(Family family) {
    for (Polynomial p : family.poles()) {
      if (sign(p, true) == 0) {
        return Optional.of("entry has a pole: " + p + " = 0");
      }
    }
    for (FamilyRelation r : family.relations()) {
      if (sign(r.polynomial(), true) != 0) {
        return Optional.of("the point is off the relation " + r.polynomial() + " = 0");
      }
    }
    for (FamilyCondition c : family.domain()) {
      boolean whetherZero = c.relation() == rankfall.spec.Spec.Relation.UNEQUAL;
      if (!c.allows(sign(c.polynomial(), whetherZero))) {
        return Optional.of("outside the domain: " + c.text());
      }
    }
    return Optional.empty();
  }

  /** The sign of a polynomial here; only whether it is 0 counts if so asked. */
  private int sign(Polynomial p, boolean whetherZero) {
    Polynomial number = p.partlyAt(values).numerator();
    if (number.isConstant()) {
      return number.constantValue().signum();
    }
    if (whetherZero) {
      return ring.constants().vanishes(number) ? 0 : 1;
    }
    return ring.tower().sign(number);
  }

  /** The value of a quotient, in the algebraic numbers. */
  RationalFunction at(RationalFunction f) {
    return f.numerator().partlyAt(values).over(f.denominator().partlyAt(values));
  }
}
