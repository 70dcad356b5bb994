package rankfall.lie;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import rankfall.exact.Chain;
import rankfall.exact.ChainFractions;
import rankfall.exact.Polynomial;
import rankfall.exact.RationalFunction;

/**
 * A symmetric form on the span of independent vectors, at the general point of a set.
 *
 * @param chain the set
 * @param matrix the values on pairs of the vectors, in canonical form
 */
public record RestrictedForm(Chain chain, List<List<RationalFunction>> matrix) {
  /** Copies the matrix. */
  public RestrictedForm {
    matrix = matrix.stream().map(List::copyOf).toList();
  }

  /**
   * A vector orthogonal to those before it.
   *
   * @param coefficients polynomials without a common factor
   * @param squaredLength its value under the form, not 0
   */
  public record Orthogonal(List<Polynomial> coefficients, RationalFunction squaredLength) {
    /** Copies the list. */
    public Orthogonal {
      coefficients = List.copyOf(coefficients);
    }
  }

  /**
   * The restriction of a form.
   *
   * @param chain the set
   * @param form n x n, symmetric
   * @param vectors each of n coordinates
   */
  public static RestrictedForm of(
      Chain chain, List<List<RationalFunction>> form, List<List<RationalFunction>> vectors) {
    List<List<RationalFunction>> out = new ArrayList<>();
    for (List<RationalFunction> x : vectors) {
      out.add(vectors.stream().map(y -> value(chain, form, x, y)).toList());
    }
    return new RestrictedForm(chain, out);
  }

  /**
   * The value of a form on two vectors.
   *
   * @param chain the set
   * @param form n x n
   * @param x n coordinates
   * @param y n coordinates
   * @return in canonical form
   */
  public static RationalFunction value(
      Chain chain,
      List<List<RationalFunction>> form,
      List<RationalFunction> x,
      List<RationalFunction> y) {
    RationalFunction sum = RationalFunction.of(chain.zero());
    for (int i = 0; i < x.size(); i++) {
      for (int j = 0; j < y.size() && !x.get(i).isZero(); j++) {
        if (!y.get(j).isZero() && !form.get(i).get(j).isZero()) {
          sum = sum.plus(x.get(i).times(form.get(i).get(j)).times(y.get(j)));
        }
      }
    }
    return ChainFractions.canonical(chain, sum);
  }

  /** The form with the opposite sign. */
  public RestrictedForm negate() {
    return new RestrictedForm(
        chain,
        matrix.stream().map(r -> r.stream().map(RationalFunction::negate).toList()).toList());
  }

  /**
   * The form on the dual space.
   *
   * @return empty if this form is degenerate all over the set
   */
  public Optional<RestrictedForm> dual() {
    return DualForm.of(chain, matrix)
        .map(
            d ->
                new RestrictedForm(
                    chain,
                    d.matrix().stream()
                        .map(r -> r.stream().map(f -> ChainFractions.canonical(chain, f)).toList())
                        .toList()));
  }

  /**
   * Orthogonal vectors that span what the first of the given ones span (Gram and Schmidt): the form
   * is positive definite exactly where all their squared lengths are positive.
   *
   * @return as many as the form has rows; empty if a leading principal minor vanishes all over the
   *     set, so that the form is positive definite nowhere
   */
  public Optional<List<Orthogonal>> orthogonal() {
    List<List<RationalFunction>> found = new ArrayList<>();
    List<Orthogonal> out = new ArrayList<>();
    List<RationalFunction> lengths = new ArrayList<>();
    int n = matrix.size();
    for (int k = 0; k < n; k++) {
      List<RationalFunction> unit = unit(n, k);
      List<RationalFunction> v = new ArrayList<>(unit);
      for (int j = 0; j < k; j++) {
        RationalFunction by = value(chain, matrix, unit, found.get(j)).over(lengths.get(j));
        for (int i = 0; i < n; i++) {
          v.set(i, ChainFractions.canonical(chain, v.get(i).minus(by.times(found.get(j).get(i)))));
        }
      }
      RationalFunction length = value(chain, matrix, v, v);
      if (length.isZero()) {
        return Optional.empty();
      }
      found.add(v);
      lengths.add(length);
      out.add(primitive(v, length));
    }
    return Optional.of(out);
  }

  private List<RationalFunction> unit(int n, int at) {
    List<RationalFunction> out = new ArrayList<>();
    for (int k = 0; k < n; k++) {
      out.add(RationalFunction.of(k == at ? chain.one() : chain.zero()));
    }
    return out;
  }

  private Orthogonal primitive(List<RationalFunction> v, RationalFunction length) {
    Polynomial common = chain.one();
    for (RationalFunction f : v) {
      common = common.times(f.denominator().over(common.gcd(f.denominator())));
    }
    List<Polynomial> integral = new ArrayList<>();
    Polynomial content = chain.zero();
    for (RationalFunction f : v) {
      Polynomial p = f.numerator().times(common.over(f.denominator()));
      integral.add(p);
      content = content.gcd(p);
    }
    Polynomial divisor = content;
    RationalFunction scale = RationalFunction.of(common, divisor);
    return new Orthogonal(
        integral.stream().map(p -> p.over(divisor)).toList(),
        ChainFractions.canonical(chain, length.times(scale).times(scale)));
  }
}
