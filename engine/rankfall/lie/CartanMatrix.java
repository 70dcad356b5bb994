package rankfall.lie;

import java.util.ArrayDeque;
import java.util.ArrayList;
import java.util.Deque;
import java.util.List;
import java.util.Optional;
import java.util.TreeSet;

/**
 * The Cartan matrix of simple roots: the entry in row i, column j is 2(a_i, a_j)/(a_j, a_j).
 *
 * <p>Types and the order of the simple roots are those of Humphreys, Introduction to Lie Algebras
 * and Representation Theory, sec. 11.4 (place from memory). A guess from the shape of the diagram
 * counts only if the matrix in that order is the one of the table.
 *
 * @param rows square, 2 on the diagonal
 */
public record CartanMatrix(List<List<Integer>> rows) {
  /** Copies the rows. */
  public CartanMatrix {
    rows = rows.stream().map(List::copyOf).toList();
  }

  /**
   * An irreducible part.
   *
   * @param letter A to G
   * @param order positions of its simple roots, in the order of the table
   */
  public record Part(char letter, List<Integer> order) {
    /** Copies the list. */
    public Part {
      order = List.copyOf(order);
    }

    /** The type, such as {@code B2}. */
    @Override
    public String toString() {
      return letter + "" + order.size();
    }
  }

  /**
   * The irreducible parts, by type.
   *
   * @return empty if one of them stands in no table
   */
  public Optional<List<Part>> parts() {
    List<Part> out = new ArrayList<>();
    TreeSet<Integer> open = new TreeSet<>();
    for (int k = 0; k < rows.size(); k++) {
      open.add(k);
    }
    while (!open.isEmpty()) {
      List<Integer> nodes = connected(open.first());
      open.removeAll(nodes);
      Optional<Part> part =
          candidates(nodes).stream()
              .filter(p -> standard(p.letter, nodes.size()).equals(in(p.order)))
              .findFirst();
      if (part.isEmpty()) {
        return Optional.empty();
      }
      out.add(part.get());
    }
    return Optional.of(out);
  }

  /** The matrix with its rows and columns in another order. */
  public CartanMatrix in(List<Integer> order) {
    return new CartanMatrix(
        order.stream().map(i -> order.stream().map(j -> rows.get(i).get(j)).toList()).toList());
  }

  private List<Integer> neighbours(int i) {
    List<Integer> out = new ArrayList<>();
    for (int j = 0; j < rows.size(); j++) {
      if (j != i && (rows.get(i).get(j) != 0 || rows.get(j).get(i) != 0)) {
        out.add(j);
      }
    }
    return out;
  }

  private List<Integer> connected(int start) {
    TreeSet<Integer> seen = new TreeSet<>(List.of(start));
    Deque<Integer> queue = new ArrayDeque<>(seen);
    while (!queue.isEmpty()) {
      for (int j : neighbours(queue.remove())) {
        if (seen.add(j)) {
          queue.add(j);
        }
      }
    }
    return List.copyOf(seen);
  }

  /** Types that fit the shape, each with an order of the nodes. */
  private List<Part> candidates(List<Integer> nodes) {
    List<Part> out = new ArrayList<>();
    List<Integer> forks = nodes.stream().filter(i -> neighbours(i).size() == 3).toList();
    if (forks.size() == 1) {
      legs(forks.get(0), out);
      return out;
    }
    for (int end : nodes) {
      if (neighbours(end).size() < 2) {
        List<Integer> path = leg(-1, end);
        if (path.size() == nodes.size()) {
          for (char letter : "ABCFG".toCharArray()) {
            out.add(new Part(letter, path));
          }
        }
      }
    }
    return out;
  }

  /**
   * The orders of a diagram with one fork: D has two legs of one node, E one of one, one of two.
   */
  private void legs(int fork, List<Part> out) {
    List<List<Integer>> legs = new ArrayList<>();
    neighbours(fork).forEach(j -> legs.add(leg(fork, j)));
    legs.sort((a, b) -> Integer.compare(a.size(), b.size()));
    List<Integer> longest = new ArrayList<>(legs.get(2));
    java.util.Collections.reverse(longest);
    List<Integer> d = new ArrayList<>(longest);
    d.add(fork);
    d.addAll(legs.get(0));
    d.addAll(legs.get(1));
    out.add(new Part('D', d));
    if (legs.get(1).size() == 2) {
      List<Integer> e = new ArrayList<>();
      e.add(legs.get(1).get(1));
      e.addAll(legs.get(0));
      e.add(legs.get(1).get(0));
      e.add(fork);
      e.addAll(legs.get(2));
      out.add(new Part('E', e));
    }
  }

  /** The nodes from one on, away from another; stops before a fork or a ring. */
  private List<Integer> leg(int before, int from) {
    List<Integer> out = new ArrayList<>();
    int last = before;
    int at = from;
    while (true) {
      out.add(at);
      int here = at;
      int back = last;
      List<Integer> on =
          neighbours(here).stream().filter(j -> j != back && !out.contains(j)).toList();
      if (on.size() != 1) {
        return out;
      }
      last = at;
      at = on.get(0);
    }
  }

  /**
   * The Cartan matrix of the table.
   *
   * @param letter A to G
   * @param n the rank
   * @return for a rank that the letter does not have a matrix that no root system has
   */
  static CartanMatrix standard(char letter, int n) {
    int[][] m = new int[n][n];
    for (int i = 0; i < n; i++) {
      m[i][i] = 2;
    }
    switch (letter) {
      case 'B' -> path(m, n > 1 ? -2 : 1, -1);
      case 'C' -> path(m, -1, n > 2 ? -2 : 1);
      case 'D' -> {
        path(m, 0, 0);
        link(m, n - 3, n - 1, n > 3 ? -1 : 1);
      }
      case 'E' -> {
        link(m, 0, 2, n > 5 && n < 9 ? -1 : 1);
        link(m, 1, 3, -1);
        for (int k = 2; k + 1 < n; k++) {
          link(m, k, k + 1, -1);
        }
      }
      case 'F' -> {
        path(m, -1, -1);
        if (n == 4) {
          m[1][2] = -2;
        } else {
          m[0][0] = 1;
        }
      }
      case 'G' -> path(m, -1, n == 2 ? -3 : 1);
      default -> path(m, -1, -1);
    }
    List<List<Integer>> rows = new ArrayList<>();
    for (int[] row : m) {
      rows.add(java.util.Arrays.stream(row).boxed().toList());
    }
    return new CartanMatrix(rows);
  }

  /** A path whose last link has the given entries above and below the diagonal. */
  private static void path(int[][] m, int above, int below) {
    int n = m.length;
    for (int k = 0; k + 1 < n; k++) {
      link(m, k, k + 1, -1);
    }
    if (n > 1) {
      m[n - 2][n - 1] = above;
      m[n - 1][n - 2] = below;
    } else if (above == 1 || below == 1) {
      m[0][0] = 1;
    }
  }

  private static void link(int[][] m, int i, int j, int entry) {
    if (i >= 0 && j < m.length) {
      m[i][j] = entry;
      m[j][i] = entry;
    }
  }
}
