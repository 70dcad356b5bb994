package rankfall.scan;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;

/**
 * Remembers what an atlas decides from which signs, in the order in which it asks for them, so that
 * the next point with the same signs costs these signs only. What is remembered follows from the
 * signs alone. One thread at a time.
 */
final class DecisionTree {
  private static final int MOST_NODES = 200_000;

  private final Atlas atlas;
  private final List<Leaf> leaves = new ArrayList<>();
  private Node root = Unknown.NODE;
  private int nodes;

  DecisionTree(Atlas atlas) {
    this.atlas = atlas;
  }

  /** A node: what is asked next, or what is decided. */
  private sealed interface Node permits Branch, Leaf, Unknown {}

  private enum Unknown implements Node {
    NODE
  }

  private static final class Branch implements Node {
    private final int polynomial;
    private final Node[] next = {Unknown.NODE, Unknown.NODE, Unknown.NODE};

    Branch(int polynomial) {
      this.polynomial = polynomial;
    }
  }

  /** A decision with a counter of the points that came to it. */
  static final class Leaf implements Node {
    private final Decision decision;
    private final int number;
    private long points;

    Leaf(Decision decision, int number) {
      this.decision = decision;
      this.number = number;
    }

    /** What is decided. */
    Decision decision() {
      return decision;
    }

    /** From 0 within the tree; -1 for a leaf that is not remembered. */
    int number() {
      return number;
    }

    /** Counts one point. */
    void count() {
      points++;
    }

    /** The points since the last time, which are forgotten. */
    long take() {
      long out = points;
      points = 0;
      return out;
    }
  }

  /** The leaves that are remembered. */
  List<Leaf> leaves() {
    return leaves;
  }

  /** The leaf of a point. */
  Leaf find(Signs at) {
    Node node = root;
    while (node instanceof Branch b) {
      node = b.next[at.sign(b.polynomial) + 1];
    }
    return node instanceof Leaf leaf ? leaf : grown(at);
  }

  private Leaf grown(Signs at) {
    Asked asked = new Asked(at, atlas.polynomials().size());
    Decision decision = atlas.decide(asked);
    if (nodes + asked.order.size() > MOST_NODES) {
      return new Leaf(decision, -1);
    }
    Leaf leaf = new Leaf(decision, leaves.size());
    leaves.add(leaf);
    if (asked.order.isEmpty()) {
      root = leaf;
      return leaf;
    }
    if (root == Unknown.NODE) {
      root = new Branch(asked.order.get(0));
    }
    Branch branch = (Branch) root;
    for (int k = 0; k < asked.order.size(); k++) {
      int slot = asked.signs[asked.order.get(k)] + 1;
      boolean last = k == asked.order.size() - 1;
      if (branch.next[slot] == Unknown.NODE) {
        branch.next[slot] = last ? leaf : new Branch(asked.order.get(k + 1));
        nodes++;
      }
      if (!last) {
        branch = (Branch) branch.next[slot];
      }
    }
    return leaf;
  }

  /** Asks each sign once and remembers the order. */
  private static final class Asked implements Signs {
    private static final int NOT_ASKED = 2;

    private final Signs at;
    private final int[] signs;
    private final List<Integer> order = new ArrayList<>();

    Asked(Signs at, int polynomials) {
      this.at = at;
      this.signs = new int[polynomials];
      Arrays.fill(signs, NOT_ASKED);
    }

    @Override
    public int sign(int polynomial) {
      if (signs[polynomial] == NOT_ASKED) {
        signs[polynomial] = at.sign(polynomial);
        order.add(polynomial);
      }
      return signs[polynomial];
    }
  }
}
