package rankfall.scan;

import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.OptionalInt;
import java.util.function.Function;
import rankfall.Analysis.Signature;

/**
 * The columns of a table of points.
 *
 * @param names of the values of a point
 * @param columns in order
 */
public record Columns(List<String> names, List<Column> columns) {
  private static final String DECIMAL = "_decimal";

  /** Copies the lists. */
  public Columns {
    names = List.copyOf(names);
    columns = List.copyOf(columns);
  }

  /** A column. */
  public sealed interface Column permits Value, Decimal, Fact {}

  /** The exact value with the given place among the names. */
  public record Value(int name) implements Column {}

  /** The same value as a decimal. */
  public record Decimal(int name) implements Column {}

  /** What a finding says. */
  public enum Fact implements Column {
    /** Whether there is an algebra. */
    STATUS(f -> f.status().word()),
    /** Of the algebra. */
    DIMENSION(f -> text(f.dimension())),
    /** Of the Killing form. */
    RANK(f -> text(f.rank())),
    /** Positive squares. */
    PLUS(f -> text(f.signature(), Signature::plus)),
    /** Negative squares. */
    MINUS(f -> text(f.signature(), Signature::minus)),
    /** Dimension of the kernel. */
    ZERO(f -> text(f.signature(), Signature::zero)),
    /** The name of the stratum. */
    STRATUM(Finding::stratum),
    /** The name of the region. */
    REGION(Finding::region),
    /** The name of the algebra. */
    TYPE(Finding::type);

    private final Function<Finding, String> cell;

    Fact(Function<Finding, String> cell) {
      this.cell = cell;
    }

    private String word() {
      return name().toLowerCase(Locale.ROOT);
    }

    /** The text of the cell. */
    public String cell(Finding f) {
      return cell.apply(f);
    }

    private static String text(OptionalInt number) {
      return number.isPresent() ? Integer.toString(number.getAsInt()) : "";
    }

    private static String text(Optional<Signature> s, Function<Signature, Integer> part) {
      return s.map(x -> Integer.toString(part.apply(x))).orElse("");
    }
  }

  /**
   * All columns: the values, the same as decimals, the facts.
   *
   * @param names of the values of a point
   */
  public static Columns all(List<String> names) {
    List<Column> out = new ArrayList<>();
    for (int v = 0; v < names.size(); v++) {
      out.add(new Value(v));
    }
    for (int v = 0; v < names.size(); v++) {
      out.add(new Decimal(v));
    }
    out.addAll(List.of(Fact.values()));
    return new Columns(names, out);
  }

  /**
   * Chosen columns.
   *
   * @param names of the values of a point; a name that is also that of a fact means the value
   * @param chosen names of columns, in the order wanted
   * @throws IllegalArgumentException if there is no such column, or one is chosen twice; the
   *     message is for the user
   */
  public static Columns of(List<String> names, List<String> chosen) {
    Columns all = all(names);
    List<String> header = all.header();
    List<Column> out = new ArrayList<>();
    for (String c : chosen) {
      int at = header.indexOf(c);
      if (at < 0) {
        throw new IllegalArgumentException(
            "there is no column '" + c + "'; there are " + String.join(", ", header));
      }
      out.add(all.columns.get(at));
    }
    if (new HashSet<>(out).size() != out.size()) {
      throw new IllegalArgumentException("a column is chosen twice in " + String.join(",", chosen));
    }
    return new Columns(names, out);
  }

  /** The names of the columns. */
  public List<String> header() {
    return columns.stream().map(this::name).toList();
  }

  private String name(Column c) {
    if (c instanceof Fact f) {
      return f.word();
    }
    return c instanceof Value v ? names.get(v.name) : names.get(((Decimal) c).name) + DECIMAL;
  }
}
