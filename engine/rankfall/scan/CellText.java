package rankfall.scan;

import java.util.List;

/** Writes cells as a part of a row of a table. */
@FunctionalInterface
public interface CellText {
  /**
   * The first cells of a row with a comma between them, quoted where they need it, no line end.
   *
   * @param cells any texts
   */
  String joined(List<String> cells);
}
