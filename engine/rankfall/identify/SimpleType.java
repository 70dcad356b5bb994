package rankfall.identify;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import java.util.stream.IntStream;

/**
 * The type of a simple complex Lie algebra, by the letters of Killing and Cartan.
 *
 * <p>Each algebra has one type only: A_1 stands for B_1 and C_1 too, B_2 for C_2, A_3 for D_3
 * (Humphreys, Introduction to Lie Algebras, section 11.4).
 *
 * @param series the letter
 * @param rank the dimension of a Cartan subalgebra
 */
public record SimpleType(Series series, int rank) implements Comparable<SimpleType> {
  private static final Comparator<SimpleType> ORDER =
      Comparator.comparing(SimpleType::series).thenComparing(SimpleType::rank);

  /** The letters. */
  public enum Series {
    /** sl(n+1). */
    A(1),
    /** so(2n+1). */
    B(2),
    /** sp(2n). */
    C(3),
    /** so(2n). */
    D(4),
    /** Rank 6 to 8. */
    E(6),
    /** Rank 4. */
    F(4),
    /** Rank 2. */
    G(2);

    private final int least;

    Series(int least) {
      this.least = least;
    }
  }

  /** Checks the rank. */
  public SimpleType {
    int most =
        switch (series) {
          case E -> 8;
          case F -> 4;
          case G -> 2;
          default -> Integer.MAX_VALUE;
        };
    if (rank < series.least || rank > most) {
      throw new IllegalArgumentException("no type " + series + rank);
    }
  }

  /**
   * All types of a dimension.
   *
   * @param dimension over the complex numbers
   * @return in the order of letters; none for a number that is no dimension
   */
  public static List<SimpleType> ofDimension(int dimension) {
    List<SimpleType> out = new ArrayList<>();
    for (Series s : Series.values()) {
      for (int rank = s.least; rank <= last(s, dimension); rank++) {
        SimpleType t = new SimpleType(s, rank);
        if (t.dimension() == dimension) {
          out.add(t);
        }
      }
    }
    return List.copyOf(out);
  }

  /**
   * The type with a letter and a rank.
   *
   * @param series the letter
   * @param rank any
   * @return empty if there is none
   */
  static Optional<SimpleType> ofRank(Series series, int rank) {
    return rank >= series.least && rank <= last(series, Integer.MAX_VALUE - 1)
        ? Optional.of(new SimpleType(series, rank))
        : Optional.empty();
  }

  private static int last(Series s, int dimension) {
    return switch (s) {
      case E -> 8;
      case F -> 4;
      case G -> 2;
      default -> (int) Math.sqrt(dimension + 1.0) + 1;
    };
  }

  /** The dimension of the algebra over the complex numbers (Humphreys, section 12.2, table 1). */
  public int dimension() {
    return switch (series) {
      case A -> rank * (rank + 2);
      case B, C -> rank * (2 * rank + 1);
      case D -> rank * (2 * rank - 1);
      case E -> rank == 6 ? 78 : rank == 7 ? 133 : 248;
      case F -> 52;
      case G -> 14;
    };
  }

  /** Whether the type is one of E, F, G. */
  public boolean exceptional() {
    return Set.of(Series.E, Series.F, Series.G).contains(series);
  }

  /**
   * The Cartan matrix {@code <alpha_i, alpha_j>}, simple roots numbered as by Bourbaki (Humphreys,
   * section 11.4, table 1).
   *
   * @return rank rows
   */
  public List<List<Integer>> cartanMatrix() {
    int[][] a = new int[rank][rank];
    for (int i = 0; i < rank; i++) {
      a[i][i] = 2;
    }
    switch (series) {
      case D -> {
        chain(a, IntStream.range(0, rank - 1).toArray());
        join(a, rank - 3, rank - 1);
      }
      case E -> {
        chain(a, IntStream.range(0, rank).filter(i -> i != 1).toArray());
        join(a, 1, 3);
      }
      default -> chain(a, IntStream.range(0, rank).toArray());
    }
    switch (series) {
      case B -> a[rank - 2][rank - 1] = -2;
      case C -> a[rank - 1][rank - 2] = -2;
      case F -> a[1][2] = -2;
      case G -> a[1][0] = -3;
      default -> {}
    }
    return IntStream.range(0, rank).mapToObj(i -> IntStream.of(a[i]).boxed().toList()).toList();
  }

  private static void chain(int[][] a, int[] nodes) {
    for (int k = 1; k < nodes.length; k++) {
      join(a, nodes[k - 1], nodes[k]);
    }
  }

  private static void join(int[][] a, int i, int j) {
    a[i][j] = -1;
    a[j][i] = -1;
  }

  @Override
  public int compareTo(SimpleType o) {
    return ORDER.compare(this, o);
  }

  /** For example {@code A2}. */
  @Override
  public String toString() {
    return series.name() + rank;
  }
}
