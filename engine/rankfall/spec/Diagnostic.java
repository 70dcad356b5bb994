package rankfall.spec;

import java.util.Optional;

/**
 * One fault of a spec: where it is, what is wrong and what would be right.
 *
 * @param place the stretch of text at fault
 * @param sourceLine the whole line of the file that holds the place, without its line end
 * @param cause what is wrong, without a full stop
 * @param advice what would be right, where that can be said
 */
public record Diagnostic(Place place, String sourceLine, String cause, Optional<String> advice) {

  /**
   * The first line of the message: {@code file:line:column: cause; advice}.
   *
   * @return one line without a line end
   */
  public String headline() {
    return place.file()
        + ":"
        + place.line()
        + ":"
        + place.column()
        + ": "
        + cause
        + advice.map(a -> "; " + a).orElse("");
  }
}
