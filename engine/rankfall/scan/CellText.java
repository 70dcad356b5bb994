package rankfall.scan;

import java.util.List;

/** Writes cells as a part of a row of a table. */
@FunctionalInterface
public interface CellText {
  /** The cells with what stands between them, quoted where they need it, no line end. */
  String joined(List<String> cells);
}
