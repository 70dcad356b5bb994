package rankfall.scan;

import java.util.Optional;
import rankfall.Analysis.Signature;

/** What the signs at a point say. */
sealed interface Decision {
  /** Everything that a scan tells. */
  record Known(Finding finding) implements Decision {}

  /**
   * The point is to be computed by itself.
   *
   * @param stratum its name, where known; else empty
   * @param region its name, where known; else empty
   * @param type the algebra, where known; else empty
   * @param signature of the region, where known
   * @param dimension of the algebra, or -1 where not known
   * @param rank of the Killing form, or -1 where not known
   */
  record Ask(
      String stratum,
      String region,
      String type,
      Optional<Signature> signature,
      int dimension,
      int rank)
      implements Decision {
    /** Nothing is known but that the point is one of the family. */
    static final Ask UNPREPARED = new Ask("", "", "", Optional.empty(), -1, -1);

    /**
     * The finding with the names that are known; those of a region only with its signature, since a
     * region that was found by samples may hold other points too.
     *
     * @throws IllegalStateException if it contradicts what is known
     */
    Finding complete(Finding direct) {
      if (dimension < 0) {
        return direct;
      }
      if (direct.dimension().orElse(-1) != dimension || direct.rank().orElse(-1) != rank) {
        throw new IllegalStateException(
            "a point of " + stratum + " has " + direct + " when computed by itself");
      }
      return signature.isEmpty() || signature.equals(direct.signature())
          ? direct.named(stratum, region, type)
          : direct.named(stratum, "", "");
    }
  }
}
