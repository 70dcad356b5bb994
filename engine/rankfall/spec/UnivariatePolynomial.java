package rankfall.spec;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.apache.commons.numbers.fraction.BigFraction;

/** The coefficients of an expression as a polynomial in its only name. */
final class UnivariatePolynomial implements Expression.Cases<Map<Integer, BigFraction>> {
  /** Higher degrees are refused. */
  static final int MAX_DEGREE = 64;

  private UnivariatePolynomial() {}

  /**
   * The coefficients, constant term first, last one not 0.
   *
   * @throws SpecFault if the expression is no polynomial in one name of degree 1 to 64 with
   *     rational coefficients
   */
  static List<BigFraction> coefficients(Expression e) {
    List<String> names =
        NameNodes.of(e).stream().map(Expression.Name::name).distinct().limit(2).toList();
    if (names.size() > 1) {
      throw SpecFault.of(
          e.place(),
          "a minimal polynomial has one variable, not '"
              + names.get(0)
              + "' and '"
              + names.get(1)
              + "'");
    }
    Map<Integer, BigFraction> terms = e.fold(new UnivariatePolynomial());
    int degree = terms.keySet().stream().mapToInt(Integer::intValue).max().orElse(0);
    if (degree < 1) {
      throw SpecFault.of(
          e.place(),
          "a minimal polynomial has a variable",
          "write a polynomial such as \"x^3 - x - 1\"");
    }
    List<BigFraction> result = new ArrayList<>();
    for (int k = 0; k <= degree; k++) {
      result.add(terms.getOrDefault(k, BigFraction.ZERO));
    }
    return List.copyOf(result);
  }

  private static SpecFault refused(Expression e) {
    return SpecFault.of(
        e.place(),
        "a minimal polynomial has rational coefficients and powers of one variable only",
        "write a polynomial such as \"x^3 - x - 1\"");
  }

  private static Map<Integer, BigFraction> add(
      Map<Integer, BigFraction> a, Map<Integer, BigFraction> b, BigFraction factor) {
    Map<Integer, BigFraction> result = new HashMap<>(a);
    b.forEach((k, c) -> result.merge(k, c.multiply(factor), BigFraction::add));
    result.values().removeIf(c -> c.signum() == 0);
    return result;
  }

  private static Map<Integer, BigFraction> multiply(
      Map<Integer, BigFraction> a, Map<Integer, BigFraction> b, Expression at) {
    Map<Integer, BigFraction> result = new HashMap<>();
    a.forEach(
        (j, c) ->
            b.forEach(
                (k, d) -> {
                  if (j + k > MAX_DEGREE) {
                    throw SpecFault.of(at.place(), "the degree goes over " + MAX_DEGREE);
                  }
                  result.merge(j + k, c.multiply(d), BigFraction::add);
                }));
    result.values().removeIf(c -> c.signum() == 0);
    return result;
  }

  @Override
  public Map<Integer, BigFraction> number(Expression.Number e) {
    return add(Map.of(), Map.of(0, e.value()), BigFraction.ONE);
  }

  @Override
  public Map<Integer, BigFraction> name(Expression.Name e) {
    if (e.name().equals("i")) {
      throw refused(e);
    }
    return Map.of(1, BigFraction.ONE);
  }

  @Override
  public Map<Integer, BigFraction> root(Expression.Root e) {
    throw refused(e);
  }

  @Override
  public Map<Integer, BigFraction> function(Expression.Function e) {
    throw refused(e);
  }

  @Override
  public Map<Integer, BigFraction> unit(Expression.MatrixUnit e) {
    throw refused(e);
  }

  @Override
  public Map<Integer, BigFraction> binary(Expression.Binary e) {
    Map<Integer, BigFraction> left = e.left().fold(this);
    return switch (e.operator()) {
      case PLUS -> add(left, e.right().fold(this), BigFraction.ONE);
      case MINUS -> add(left, e.right().fold(this), BigFraction.ONE.negate());
      case TIMES -> multiply(left, e.right().fold(this), e);
      case OVER -> {
        Optional<BigFraction> divisor = RationalValue.of(e.right());
        if (divisor.isEmpty()) {
          throw refused(e);
        }
        yield add(Map.of(), left, divisor.get().reciprocal());
      }
    };
  }

  @Override
  public Map<Integer, BigFraction> negation(Expression.Negation e) {
    return add(Map.of(), e.operand().fold(this), BigFraction.ONE.negate());
  }

  @Override
  public Map<Integer, BigFraction> power(Expression.Power e) {
    Optional<BigFraction> value = RationalValue.of(e);
    if (value.isPresent()) {
      return add(Map.of(), Map.of(0, value.get()), BigFraction.ONE);
    }
    if (e.exponent() < 0 || NameNodes.of(e.base()).isEmpty()) {
      throw refused(e);
    }
    Map<Integer, BigFraction> base = e.base().fold(this);
    Map<Integer, BigFraction> result = Map.of(0, BigFraction.ONE);
    for (int k = 0; k < e.exponent(); k++) {
      result = multiply(result, base, e);
    }
    return result;
  }
}
