package rankfall.spec;

/**
 * A stretch of text in a spec file.
 *
 * @param file the file as the user named it
 * @param line line number, from 1
 * @param column column number in code points, from 1
 * @param length number of code points, at least 1
 */
public record Place(String file, int line, int column, int length) {
  /**
   * Checks that the numbers can be a place.
   *
   * @param file the file as the user named it
   * @param line line number, from 1
   * @param column column number in code points, from 1
   * @param length number of code points, at least 1
   */
  public Place {
    if (line < 1 || column < 1 || length < 1) {
      throw new IllegalArgumentException("no place: " + line + ":" + column + "+" + length);
    }
  }
}
