package rankfall.lie;

import java.math.BigInteger;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import org.matheclipse.core.eval.EvalEngine;
import org.matheclipse.core.expression.F;
import org.matheclipse.core.interfaces.IAST;
import org.matheclipse.core.interfaces.IExpr;
import org.matheclipse.core.interfaces.IInteger;
import org.matheclipse.core.interfaces.ISymbol;
import rankfall.exact.Polynomial;
import rankfall.exact.Term;
import rankfall.exact.Variables;

/**
 * The ad-traces {@code K_ij = trace(ad_i ad_j) = sum_kl C_ik^l C_jl^k}, summed and expanded by
 * Symja.
 *
 * <p>Only products of two non-zero structure constants are formed. Variables are handed over under
 * names of our own, so that no parameter meets a built-in name. One object serves one thread.
 */
public final class AdjointTraces {
  private final Variables variables;
  private final List<ISymbol> symbols;
  private final Map<ISymbol, Integer> positions = new HashMap<>();
  private final EvalEngine engine;

  /**
   * Prepares the symbols of a ring.
   *
   * @param variables the ring of the structure constants
   */
  public AdjointTraces(Variables variables) {
    this.variables = variables;
    this.engine = new EvalEngine(true);
    EvalEngine.set(engine);
    this.symbols = new ArrayList<>();
    for (int k = 0; k < variables.count(); k++) {
      ISymbol s = F.Dummy("rankfallvariable" + k);
      symbols.add(s);
      positions.put(s, k);
    }
  }

  /**
   * Loads what the first trace needs, so that it may happen while specs are read.
   *
   * @throws IllegalStateException if one and one do not make two
   */
  public static void warmUp() {
    EvalEngine.set(new EvalEngine(true));
    if (!F.eval(F.Plus(F.C1, F.C1)).equals(F.C2)) {
      throw new IllegalStateException("the algebra library does not answer");
    }
  }

  /**
   * All traces.
   *
   * @param constants the C of an algebra of dimension n
   * @return n x n, symmetric; polynomials of the ring, not reduced by any equation
   */
  public List<List<Polynomial>> of(StructureConstants<Polynomial> constants) {
    EvalEngine.set(engine);
    int n = constants.dimension();
    List<Map<Long, IExpr>> adjoint = new ArrayList<>();
    for (int i = 0; i < n; i++) {
      adjoint.add(sparseAdjoint(constants, i));
    }
    Polynomial zero = Polynomial.zero(variables);
    Polynomial[][] k = new Polynomial[n][n];
    for (int i = 0; i < n; i++) {
      for (int j = i; j < n; j++) {
        List<IExpr> products = products(adjoint.get(i), adjoint.get(j));
        k[i][j] = products.isEmpty() ? zero : polynomial(sum(products));
        k[j][i] = k[i][j];
      }
    }
    List<List<Polynomial>> out = new ArrayList<>();
    for (Polynomial[] row : k) {
      out.add(List.of(row));
    }
    return List.copyOf(out);
  }

  /** Entry (k, l) of ad_i is the coefficient of l in the bracket of i with k. */
  private Map<Long, IExpr> sparseAdjoint(StructureConstants<Polynomial> constants, int i) {
    Map<Long, IExpr> out = new TreeMap<>();
    for (int k = 0; k < constants.dimension(); k++) {
      for (var e : constants.bracket(i, k).entrySet()) {
        out.put(key(k, e.getKey()), expression(e.getValue()));
      }
    }
    return out;
  }

  private static long key(int k, int l) {
    return ((long) k << 32) | l;
  }

  private static List<IExpr> products(Map<Long, IExpr> a, Map<Long, IExpr> b) {
    List<IExpr> out = new ArrayList<>();
    for (var e : a.entrySet()) {
      int k = (int) (e.getKey() >> 32);
      int l = e.getKey().intValue();
      IExpr partner = b.get(key(l, k));
      if (partner != null) {
        out.add(F.Times(e.getValue(), partner));
      }
    }
    return out;
  }

  private IExpr sum(List<IExpr> products) {
    return engine.evaluate(F.Expand(F.Plus(products.toArray(new IExpr[0]))));
  }

  private IExpr expression(Polynomial p) {
    List<IExpr> terms = new ArrayList<>();
    for (Term t : p.terms()) {
      List<IExpr> factors = new ArrayList<>();
      factors.add(F.ZZ(t.coefficient()));
      for (int v = 0; v < t.exponents().size(); v++) {
        int e = t.exponents().get(v);
        if (e == 1) {
          factors.add(symbols.get(v));
        } else if (e > 1) {
          factors.add(F.Power(symbols.get(v), F.ZZ(e)));
        }
      }
      terms.add(factors.size() == 1 ? factors.get(0) : F.Times(factors.toArray(new IExpr[0])));
    }
    return terms.size() == 1 ? terms.get(0) : F.Plus(terms.toArray(new IExpr[0]));
  }

  private Polynomial polynomial(IExpr e) {
    List<Term> terms = new ArrayList<>();
    if (e.isPlus()) {
      for (IExpr summand : (IAST) e) {
        terms.add(term(summand));
      }
    } else if (!e.isZero()) {
      terms.add(term(e));
    }
    return Polynomial.of(variables, terms);
  }

  private Term term(IExpr e) {
    int[] exponents = new int[variables.count()];
    BigInteger coefficient = BigInteger.ONE;
    if (e.isTimes()) {
      for (IExpr factor : (IAST) e) {
        coefficient = coefficient.multiply(collect(factor, exponents));
      }
    } else {
      coefficient = collect(e, exponents);
    }
    List<Integer> list = new ArrayList<>();
    for (int x : exponents) {
      list.add(x);
    }
    return new Term(coefficient, list);
  }

  /** Adds the exponents of one factor of a monomial and returns its integer, 1 if it is none. */
  private BigInteger collect(IExpr factor, int[] exponents) {
    if (factor instanceof IInteger number) {
      return number.toBigNumerator();
    }
    if (factor instanceof ISymbol symbol && positions.containsKey(symbol)) {
      exponents[positions.get(symbol)]++;
      return BigInteger.ONE;
    }
    if (factor.isPower() && positions.containsKey(factor.base())) {
      exponents[positions.get(factor.base())] += factor.exponent().toIntDefault();
      return BigInteger.ONE;
    }
    throw new IllegalStateException("a trace is not an expanded polynomial");
  }
}
