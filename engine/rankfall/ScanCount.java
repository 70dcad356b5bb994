package rankfall;

import java.util.Optional;
import java.util.OptionalInt;
import rankfall.Analysis.Signature;

/**
 * Points of a grid of which the same is said.
 *
 * @param status {@code ok}, {@code outside}, {@code pole}, {@code off} or {@code open}
 * @param stratum its name; empty where there is no algebra, or strata are not known
 * @param region its name; empty where the points lie in none
 * @param dimension of the algebra; empty where there is none
 * @param rank of its Killing form; empty where there is none
 * @param signature of its Killing form, where there is one
 * @param type the algebra, where known; else empty
 * @param points how many
 */
public record ScanCount(
    String status,
    String stratum,
    String region,
    OptionalInt dimension,
    OptionalInt rank,
    Optional<Signature> signature,
    String type,
    long points) {}
