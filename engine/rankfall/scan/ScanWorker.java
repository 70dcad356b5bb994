package rankfall.scan;

import java.math.BigInteger;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.apache.commons.numbers.fraction.BigFraction;
import rankfall.scan.DecisionTree.Leaf;
import rankfall.scan.Finding.Status;

/** Finds what a scan says of the points of blocks. One thread at a time. */
final class ScanWorker {
  private final DirectPoints direct;
  private final List<Long> denominators;
  private final SignProgram signs;
  private final DecisionTree tree;
  private final Optional<RowText> rows;
  private Map<Finding, Long> counted = new HashMap<>();

  /**
   * A worker.
   *
   * @param plan what is scanned
   */
  ScanWorker(ScanPlan plan) {
    direct = plan.direct();
    tree = new DecisionTree(plan.atlas());
    if (plan.points() instanceof Lattice lattice) {
      denominators = lattice.denominators();
      signs = SignProgram.along(plan.atlas().frame(), plan.atlas().polynomials(), lattice);
    } else {
      denominators = List.of();
      signs = SignProgram.anywhere(plan.atlas().frame(), plan.atlas().polynomials());
    }
    rows = plan.table().map(t -> new RowText(t.columns(), denominators, t.cells()));
  }

  /** Works through a block. */
  ScanPart work(ScanBlock block) {
    if (block instanceof ScanBlock.Range range) {
      walk(range);
    } else {
      for (PointList.Row row : ((ScanBlock.Rows) block).rows()) {
        answer(row);
      }
    }
    for (Leaf leaf : tree.leaves()) {
      long n = leaf.take();
      if (n > 0) {
        counted.merge(((Decision.Known) leaf.decision()).finding(), n, Long::sum);
      }
    }
    ScanPart out = new ScanPart(rows.map(RowText::take).orElse(new byte[0]), new Tally(counted));
    counted = new HashMap<>();
    return out;
  }

  private void walk(ScanBlock.Range range) {
    Lattice lattice = range.lattice();
    int inner = lattice.inner();
    long length = lattice.lineLength();
    long[] at = new long[lattice.names().size()];
    long number = range.from();
    while (number < range.to()) {
      long lineEnd = Math.min(range.to(), (number / length + 1) * length);
      lattice.put(number, at);
      signs.enter(at);
      for (; number < lineEnd; number++) {
        if (length > 1) {
          at[inner] = lattice.innerAt(number);
          signs.move(at[inner]);
        }
        Leaf leaf = tree.find(signs);
        if (leaf.decision() instanceof Decision.Known known) {
          count(leaf, known.finding());
          if (rows.isPresent()) {
            rows.get().row(at, rows.get().facts(leaf, known.finding()));
          }
        } else {
          Finding f = asked((Decision.Ask) leaf.decision(), values(at));
          if (rows.isPresent()) {
            rows.get().row(at, rows.get().facts(f));
          }
        }
      }
    }
  }

  private void count(Leaf leaf, Finding f) {
    if (leaf.number() < 0) {
      counted.merge(f, 1L, Long::sum);
    } else {
      leaf.count();
    }
  }

  private Finding asked(Decision.Ask ask, List<BigFraction> point) {
    Finding f = ask.complete(direct.at(point).directly());
    counted.merge(f, 1L, Long::sum);
    return f;
  }

  private List<BigFraction> values(long[] numerators) {
    List<BigFraction> out = new ArrayList<>();
    for (int v = 0; v < numerators.length; v++) {
      out.add(
          BigFraction.of(
              BigInteger.valueOf(numerators[v]), BigInteger.valueOf(denominators.get(v))));
    }
    return out;
  }

  private void answer(PointList.Row row) {
    Finding f;
    if (row.values().isEmpty()) {
      f = Finding.without(Status.UNREADABLE);
      counted.merge(f, 1L, Long::sum);
    } else {
      signs.enter(row.values().get());
      Leaf leaf = tree.find(signs);
      if (leaf.decision() instanceof Decision.Known known) {
        f = known.finding();
        count(leaf, f);
      } else {
        f = asked((Decision.Ask) leaf.decision(), row.values().get());
      }
    }
    if (rows.isPresent()) {
      rows.get().row(row, rows.get().facts(f));
    }
  }
}
