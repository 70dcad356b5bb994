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

  /** What is said of each point of a lattice, in order. */
  List<Finding> each(Lattice lattice) {
    List<Finding> out = new ArrayList<>();
    walk(new ScanBlock.Range(lattice, 0, lattice.size()), (at, leaf, f) -> out.add(f));
    return out;
  }

  /** Hears of a point: its numerators, where the signs led, and the finding. */
  private interface Heard {
    void point(long[] at, Leaf leaf, Finding f);
  }

  private void write(long[] at, Leaf leaf, Finding f) {
    RowText text = rows.orElseThrow();
    boolean known = leaf.decision() instanceof Decision.Known;
    text.row(at, known ? text.facts(leaf, f) : text.facts(f));
  }

  /**
   * Works through a block.
   *
   * @param withHeader whether a table begins with it
   */
  ScanPart work(ScanBlock block, boolean withHeader) {
    if (withHeader && rows.isPresent()) {
      rows.get().header();
    }
    if (block instanceof ScanBlock.Range range) {
      walk(range, rows.isPresent() ? this::write : (at, leaf, f) -> {});
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

  private void walk(ScanBlock.Range range, Heard heard) {
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
          heard.point(at, leaf, known.finding());
        } else {
          heard.point(at, leaf, asked((Decision.Ask) leaf.decision(), values(at)));
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
