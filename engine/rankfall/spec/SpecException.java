package rankfall.spec;

import java.util.List;
import java.util.stream.Collectors;

/** Ends one spec, never the batch: the faults that were found in it. */
public final class SpecException extends Exception {
  private static final long serialVersionUID = 1L;

  private final transient List<Diagnostic> diagnostics;

  /**
   * A spec that cannot be analysed.
   *
   * @param diagnostics the faults, at least one, in the order of the text
   */
  public SpecException(List<Diagnostic> diagnostics) {
    super(diagnostics.stream().map(Diagnostic::headline).collect(Collectors.joining("\n")));
    if (diagnostics.isEmpty()) {
      throw new IllegalArgumentException("no fault given");
    }
    this.diagnostics = List.copyOf(diagnostics);
  }

  /**
   * The faults in the order of the text.
   *
   * @return at least one fault
   */
  public List<Diagnostic> diagnostics() {
    return diagnostics;
  }
}
