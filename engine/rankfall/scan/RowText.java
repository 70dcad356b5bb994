package rankfall.scan;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import org.apache.commons.numbers.fraction.BigFraction;
import rankfall.exact.Rationals;
import rankfall.scan.Columns.Column;
import rankfall.scan.Columns.Decimal;
import rankfall.scan.Columns.Fact;
import rankfall.scan.Columns.Value;

/** Writes rows. One thread at a time. */
final class RowText {
  private static final byte COMMA = ',';
  private static final byte[] END = {'\r', '\n'};

  private final List<List<Column>> pieces = new ArrayList<>();
  private final List<ValueText> texts = new ArrayList<>();
  private final CellText cells;
  private final byte[] head;
  private final Bytes out = new Bytes();
  private byte[][][] known = new byte[16][][];

  /**
   * A form of rows.
   *
   * @param columns of the table
   * @param denominators one a name; empty for points without common denominators
   * @param cells quotes what needs it
   */
  RowText(Columns columns, List<Long> denominators, CellText cells) {
    this.cells = cells;
    this.head = Bytes.of(cells.joined(columns.header()));
    for (Column c : columns.columns()) {
      List<Column> last = pieces.isEmpty() ? List.of() : pieces.get(pieces.size() - 1);
      if (c instanceof Fact && !last.isEmpty() && last.get(0) instanceof Fact) {
        last.add(c);
      } else {
        pieces.add(new ArrayList<>(List.of(c)));
      }
    }
    for (List<Column> piece : pieces) {
      if (piece.get(0) instanceof Fact || denominators.isEmpty()) {
        texts.add(new ValueText(1, false));
      } else {
        int name = name(piece.get(0));
        texts.add(new ValueText(denominators.get(name), piece.get(0) instanceof Decimal));
      }
    }
  }

  private static int name(Column c) {
    return c instanceof Value v ? v.name() : ((Decimal) c).name();
  }

  /** The facts of a finding, one text a piece; empty for a piece that is a value. */
  byte[][] facts(Finding f) {
    byte[][] facts = new byte[pieces.size()][];
    for (int k = 0; k < facts.length; k++) {
      List<Column> piece = pieces.get(k);
      facts[k] =
          piece.get(0) instanceof Fact
              ? Bytes.of(joined(k, piece.stream().map(c -> ((Fact) c).cell(f)).toList()))
              : null;
    }
    return facts;
  }

  /** Cells of a piece; an empty cell is quoted only where a row begins with it. */
  private String joined(int piece, List<String> texts) {
    if (piece == 0) {
      return cells.joined(texts);
    }
    List<String> behindAnother = new ArrayList<>(List.of("0"));
    behindAnother.addAll(texts);
    return cells.joined(behindAnother).substring(2);
  }

  /** The facts of a leaf, remembered. */
  byte[][] facts(DecisionTree.Leaf leaf, Finding f) {
    int n = leaf.number();
    if (n < 0) {
      return facts(f);
    }
    if (n >= known.length) {
      known = Arrays.copyOf(known, 2 * n);
    }
    if (known[n] == null) {
      known[n] = facts(f);
    }
    return known[n];
  }

  /** Writes a row of a lattice. */
  void row(long[] numerators, byte[][] facts) {
    for (int k = 0; k < facts.length; k++) {
      if (k > 0) {
        out.append(COMMA);
      }
      out.append(
          facts[k] != null ? facts[k] : texts.get(k).of(numerators[name(pieces.get(k).get(0))]));
    }
    out.append(END);
  }

  /** Writes a row of a list. */
  void row(PointList.Row row, byte[][] facts) {
    for (int k = 0; k < facts.length; k++) {
      if (k > 0) {
        out.append(COMMA);
      }
      out.append(facts[k] != null ? facts[k] : Bytes.of(value(row, k)));
    }
    out.append(END);
  }

  private String value(PointList.Row row, int piece) {
    Column c = pieces.get(piece).get(0);
    if (row.values().isPresent()) {
      BigFraction value = row.values().get().get(name(c));
      return c instanceof Value ? Rationals.text(value) : DecimalText.of(value);
    }
    String given = c instanceof Value ? row.texts().get(name(c)) : "";
    return joined(piece, List.of(given));
  }

  /** What was written; it is forgotten. */
  byte[] take() {
    return out.take();
  }

  /** Writes the header row. */
  void header() {
    out.append(head);
    out.append(END);
  }
}
