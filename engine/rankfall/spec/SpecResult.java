package rankfall.spec;

import java.util.List;
import java.util.Optional;

/** What became of one YAML document of a spec file. */
public sealed interface SpecResult {

  /**
   * A document without a fault.
   *
   * @param spec what it says
   */
  record Read(Spec spec) implements SpecResult {}

  /**
   * A document that cannot be analysed.
   *
   * @param family the name of the family, where it could be read
   * @param diagnostics the faults in the order of the text, 1 to 20
   */
  record Faulty(Optional<String> family, List<Diagnostic> diagnostics) implements SpecResult {
    /**
     * Copies the list.
     *
     * @param family the name of the family, where it could be read
     * @param diagnostics the faults, at least one
     */
    public Faulty {
      diagnostics = List.copyOf(diagnostics);
      if (diagnostics.isEmpty()) {
        throw new IllegalArgumentException("no fault given");
      }
    }
  }

  /**
   * The spec, or the faults as an exception.
   *
   * @return the spec of a document that was read
   * @throws SpecException if the document is faulty
   */
  default Spec orThrow() throws SpecException {
    if (this instanceof Read read) {
      return read.spec();
    }
    throw new SpecException(((Faulty) this).diagnostics());
  }
}
