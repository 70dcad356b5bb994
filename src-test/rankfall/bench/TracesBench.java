package rankfall.bench;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.concurrent.TimeUnit;
import org.matheclipse.core.eval.EvalEngine;
import org.matheclipse.core.expression.F;
import org.matheclipse.core.interfaces.IExpr;
import org.matheclipse.core.interfaces.ISymbol;
import org.openjdk.jmh.annotations.Benchmark;
import org.openjdk.jmh.annotations.BenchmarkMode;
import org.openjdk.jmh.annotations.Fork;
import org.openjdk.jmh.annotations.Level;
import org.openjdk.jmh.annotations.Measurement;
import org.openjdk.jmh.annotations.Mode;
import org.openjdk.jmh.annotations.OutputTimeUnit;
import org.openjdk.jmh.annotations.Param;
import org.openjdk.jmh.annotations.Scope;
import org.openjdk.jmh.annotations.Setup;
import org.openjdk.jmh.annotations.State;
import org.openjdk.jmh.annotations.Warmup;
import rankfall.exact.Polynomial;
import rankfall.exact.Term;
import rankfall.lie.AdjointTraces;
import rankfall.lie.StructureConstants;

/**
 * Ad-traces of so(n) against the bare library that expands the same non-zero products; compare the
 * two of one run, and their growth with n.
 */
@State(Scope.Benchmark)
@BenchmarkMode(Mode.SingleShotTime)
@OutputTimeUnit(TimeUnit.MILLISECONDS)
@Fork(1)
@Warmup(iterations = 4)
@Measurement(iterations = 5)
public class TracesBench {
  /** The n of so(n). */
  @Param({"8", "10", "12", "14", "16"})
  public int n;

  private StructureConstants<Polynomial> constants;
  private EvalEngine engine;
  private List<IExpr> sums;

  /** Builds the algebra, and the sums anew for every run: a sum remembers that it was expanded. */
  @Setup(Level.Invocation)
  public void build() {
    constants = RotationAlgebra.of(n);
    engine = new EvalEngine(true);
    EvalEngine.set(engine);
    sums = sums();
  }

  /** All traces by the engine. */
  @Benchmark
  public List<List<Polynomial>> traces() {
    return new AdjointTraces(constants.domain().one().variables()).of(constants);
  }

  /** The bare library on the same products. */
  @Benchmark
  public List<IExpr> bareExpand() {
    EvalEngine.set(engine);
    List<IExpr> out = new ArrayList<>();
    for (IExpr sum : sums) {
      out.add(engine.evaluate(F.Expand(sum)));
    }
    return out;
  }

  private List<IExpr> sums() {
    int size = constants.dimension();
    List<ISymbol> symbols = new ArrayList<>();
    for (int v = 0; v < n; v++) {
      symbols.add(F.Dummy("benchvariable" + v));
    }
    List<Map<List<Integer>, IExpr>> adjoint = new ArrayList<>();
    for (int i = 0; i < size; i++) {
      Map<List<Integer>, IExpr> entries = new HashMap<>();
      for (int k = 0; k < size; k++) {
        int row = k;
        constants
            .bracket(i, k)
            .forEach((l, c) -> entries.put(List.of(row, l), expression(c, symbols)));
      }
      adjoint.add(entries);
    }
    List<IExpr> out = new ArrayList<>();
    for (int i = 0; i < size; i++) {
      for (int j = i; j < size; j++) {
        List<IExpr> products = products(adjoint.get(i), adjoint.get(j));
        if (!products.isEmpty()) {
          out.add(F.Plus(products.toArray(new IExpr[0])));
        }
      }
    }
    return out;
  }

  private static List<IExpr> products(
      Map<List<Integer>, IExpr> left, Map<List<Integer>, IExpr> right) {
    List<IExpr> out = new ArrayList<>();
    left.forEach(
        (at, a) -> {
          IExpr b = right.get(List.of(at.get(1), at.get(0)));
          if (b != null) {
            out.add(F.Times(a, b));
          }
        });
    return out;
  }

  /** Plus or minus one variable. */
  private static IExpr expression(Polynomial p, List<ISymbol> symbols) {
    Term term = p.terms().get(0);
    return F.Times(F.ZZ(term.coefficient()), symbols.get(term.exponents().indexOf(1)));
  }
}
