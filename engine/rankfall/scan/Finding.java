package rankfall.scan;

import java.util.Optional;
import java.util.OptionalInt;
import rankfall.Analysis.Signature;

/**
 * What a scan says of a point.
 *
 * @param status whether there is an algebra
 * @param dimension of the algebra; empty unless the status is ok
 * @param rank of its Killing form; empty unless the status is ok
 * @param signature of its Killing form; empty over complex ground, and unless the status is ok
 * @param stratum its name; empty where strata are not known
 * @param region its name; empty where the point lies in none, as on the boundary of regions
 * @param type the algebra, where known for the point; else empty
 * @param direct whether the point was computed by itself, without prepared regions
 */
public record Finding(
    Status status,
    OptionalInt dimension,
    OptionalInt rank,
    Optional<Signature> signature,
    String stratum,
    String region,
    String type,
    boolean direct) {

  /** Whether there is an algebra at a point. */
  public enum Status {
    /** There is. */
    OK("ok"),
    /** The point does not satisfy the conditions of the spec. */
    OUTSIDE("outside"),
    /** An entry is undefined. */
    POLE("pole"),
    /** A relation between the parameters fails. */
    OFF("off"),
    /** The span is not closed, or Jacobi's identity fails. */
    OPEN("open"),
    /** The given texts are no point. */
    UNREADABLE("unreadable");

    private final String word;

    Status(String word) {
      this.word = word;
    }

    /** As a table says it. */
    public String word() {
      return word;
    }
  }

  /**
   * A point without an algebra.
   *
   * @param status not {@link Status#OK}
   */
  public static Finding without(Status status) {
    return new Finding(
        status, OptionalInt.empty(), OptionalInt.empty(), Optional.empty(), "", "", "", false);
  }

  /** The same, computed by itself. */
  public Finding directly() {
    return new Finding(status, dimension, rank, signature, stratum, region, type, true);
  }

  /** The same with names. */
  Finding named(String stratumName, String regionName, String typeName) {
    return new Finding(
        status, dimension, rank, signature, stratumName, regionName, typeName, direct);
  }
}
