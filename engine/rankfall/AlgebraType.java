package rankfall;

import java.util.List;

/**
 * A Lie algebra by name.
 *
 * @param name the preferred name, such as {@code so(3,1)}
 * @param otherNames names that are as right, such as a Bianchi type; may be empty
 * @param everywhere whether it is proved for all points of the region; else it is the algebra at
 *     the witness
 */
public record AlgebraType(String name, List<String> otherNames, boolean everywhere) {
  /** Copies the list. */
  public AlgebraType {
    otherNames = List.copyOf(otherNames);
  }

  /** The name, with a note where it is known at the witness only. */
  public String text() {
    return everywhere ? name : "at the witness: " + name;
  }
}
