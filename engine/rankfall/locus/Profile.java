package rankfall.locus;

/**
 * What stratifies: four ranks of explicit matrices.
 *
 * @param dimension of the span
 * @param rank of the Killing form
 * @param derived dimension of the derived algebra
 * @param centre dimension of the centre
 */
public record Profile(int dimension, int rank, int derived, int centre)
    implements Comparable<Profile> {

  /** Descending: the most general profile first. */
  @Override
  public int compareTo(Profile o) {
    int c = Integer.compare(o.dimension, dimension);
    c = c != 0 ? c : Integer.compare(o.rank, rank);
    c = c != 0 ? c : Integer.compare(o.derived, derived);
    return c != 0 ? c : Integer.compare(centre, o.centre);
  }

  /**
   * Whether points of this profile may lie in the closure of points of another one: ranks fall on
   * closed sets, the dimension of the span before all others.
   */
  public boolean mayBeLimitOf(Profile general) {
    if (dimension != general.dimension) {
      return dimension < general.dimension;
    }
    return rank <= general.rank && derived <= general.derived && centre >= general.centre;
  }
}
