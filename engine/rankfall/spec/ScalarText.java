package rankfall.spec;

import java.util.Locale;

/** The text of one YAML scalar, with the place in the file of each of its code points. */
final class ScalarText {
  /** How a scalar is written. */
  enum Style {
    PLAIN,
    SINGLE_QUOTED,
    DOUBLE_QUOTED,
    BLOCK
  }

  private final FileText file;
  private final String value;
  private final Style style;
  private final Place whole;
  private final int[] points;
  private final int[] lines;
  private final int[] columns;

  /**
   * Finds every code point of {@code value} again in the file: line ends that were folded,
   * indentation that was taken off, doubled quotes and escapes are walked over.
   *
   * @param line where the scalar starts, from 0; of a block scalar the line of its {@code |}
   * @param column where it starts, from 0
   */
  ScalarText(FileText file, String value, Style style, Place whole, int line, int column) {
    this.file = file;
    this.value = value;
    this.style = style;
    this.whole = whole;
    points = value.codePoints().toArray();
    lines = new int[points.length];
    columns = new int[points.length];
    Cursor cursor =
        style == Style.BLOCK
            ? new Cursor(line + 1, 0)
            : new Cursor(line, column + (style == Style.PLAIN ? 0 : 1));
    for (int k = 0; k < points.length; k++) {
      cursor.match(points[k]);
      lines[k] = cursor.foundLine;
      columns[k] = cursor.foundColumn;
    }
  }

  String value() {
    return value;
  }

  Place place() {
    return whole;
  }

  boolean isPlain() {
    return style == Style.PLAIN;
  }

  /** Nothing was written, or a plain {@code null}. */
  boolean isNull() {
    return isPlain()
        && (value.isEmpty() || value.equals("~") || value.toLowerCase(Locale.ROOT).equals("null"));
  }

  int size() {
    return points.length;
  }

  int at(int index) {
    return points[index];
  }

  String slice(int from, int to) {
    return new String(points, from, to - from);
  }

  /** The place of the code points {@code from <= k < to}, as far as they stand on one line. */
  Place place(int from, int to) {
    if (points.length == 0) {
      return whole;
    }
    if (from >= points.length) {
      int last = points.length - 1;
      return file.place(lines[last], columns[last] + 1, 1);
    }
    int last = from;
    while (last + 1 < to && lines[last + 1] == lines[from]) {
      last++;
    }
    return file.place(lines[from], columns[from], columns[last] - columns[from] + 1);
  }

  /** Walks the file beside the value. */
  private final class Cursor {
    private int line;
    private int column;
    private int foundLine;
    private int foundColumn;

    Cursor(int line, int column) {
      this.line = line;
      this.column = column;
      foundLine = line;
      foundColumn = column;
    }

    private boolean inFile() {
      return line < file.lineCount();
    }

    private boolean atLineEnd() {
      return column >= file.lengthOf(line);
    }

    private boolean atBlank() {
      return atLineEnd() || file.at(line, column) == ' ' || file.at(line, column) == '\t';
    }

    private void step() {
      if (atLineEnd()) {
        line++;
        column = 0;
      } else {
        column++;
      }
    }

    private void found() {
      foundLine = line;
      foundColumn = column;
    }

    void match(int wanted) {
      boolean blank = wanted == ' ' || wanted == '\t' || wanted == '\n';
      while (inFile() && ((!blank && atBlank()) || isEscapedLineEnd())) {
        step();
      }
      if (!inFile()) {
        return;
      }
      found();
      if (!blank) {
        column += width();
      } else if (wanted != '\n' && atLineEnd()) {
        step();
        while (inFile() && !atLineEnd() && atBlank()) {
          step();
        }
      } else if (atBlank() || isEscape()) {
        int width = width();
        if (width == 1) {
          step();
        } else {
          column += width;
        }
      }
    }

    private boolean isEscape() {
      return style == Style.DOUBLE_QUOTED && !atLineEnd() && file.at(line, column) == '\\';
    }

    private boolean isEscapedLineEnd() {
      return isEscape() && column + 1 >= file.lengthOf(line);
    }

    /** How many code points of the file stand for the one found. */
    private int width() {
      if (atLineEnd()) {
        return 1;
      }
      if (style == Style.SINGLE_QUOTED && file.at(line, column) == '\'') {
        return 2;
      }
      if (!isEscape()) {
        return 1;
      }
      return switch (file.at(line, column + 1)) {
        case 'x' -> 4;
        case 'u' -> 6;
        case 'U' -> 10;
        default -> 2;
      };
    }
  }
}
