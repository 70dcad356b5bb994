package rankfall.report;

import java.io.BufferedReader;
import java.io.IOException;
import java.io.Reader;
import java.io.UncheckedIOException;
import java.util.ArrayList;
import java.util.HashSet;
import java.util.Iterator;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.NoSuchElementException;
import java.util.Optional;
import java.util.Set;
import org.apache.commons.csv.CSVFormat;
import org.apache.commons.csv.CSVParser;
import org.apache.commons.csv.CSVRecord;
import org.apache.commons.numbers.fraction.BigFraction;
import rankfall.spec.ExactNumber;

/**
 * The rows of a CSV table whose header names values of points.
 *
 * <p>A point is a line: a quoted cell does not hold a line end, so that a broken quote spoils its
 * own row only. Empty lines are passed over; a byte order mark may stand in front.
 */
final class PointRows implements Iterator<PointRows.Row> {
  private static final CSVFormat FORMAT =
      CSVFormat.RFC4180.builder().setIgnoreSurroundingSpaces(true).get();
  private static final String BYTE_ORDER_MARK = "\uFEFF";

  private final BufferedReader lines;
  private final List<String> header;
  private Optional<String> next = Optional.empty();
  private int line;

  /**
   * Reads the header.
   *
   * @param table the text; stays open
   * @throws UncheckedIOException if the table cannot be read
   * @throws IllegalArgumentException if there is no header, or it names a column twice
   */
  PointRows(Reader table) {
    lines = new BufferedReader(table);
    advance();
    String text =
        next.orElseThrow(
            () -> new IllegalArgumentException("the table is empty; its first line names columns"));
    header =
        cells(text.startsWith(BYTE_ORDER_MARK) ? text.substring(1) : text)
            .orElseThrow(
                () -> new IllegalArgumentException("the header of the table has a broken quote"));
    Set<String> seen = new HashSet<>();
    for (String name : header) {
      if (!seen.add(name)) {
        throw new IllegalArgumentException("the header of the table names '" + name + "' twice");
      }
    }
    advance();
  }

  /** A row. */
  sealed interface Row {
    /** The cells by name, as far as there are any. */
    Map<String, String> texts();
  }

  /** A row of numbers. */
  record Numbers(Map<String, String> texts, Map<String, BigFraction> values) implements Row {}

  /** A row that is no point; the error says in one line where and why. */
  record Broken(Map<String, String> texts, String error) implements Row {}

  /** The names of the columns. */
  List<String> header() {
    return header;
  }

  @Override
  public boolean hasNext() {
    return next.isPresent();
  }

  @Override
  public Row next() {
    String text = next.orElseThrow(NoSuchElementException::new);
    Row out = row(text);
    advance();
    return out;
  }

  /** Goes to the next line that is not empty. */
  private void advance() {
    try {
      String text = lines.readLine();
      line++;
      while (text != null && text.isBlank()) {
        text = lines.readLine();
        line++;
      }
      next = Optional.ofNullable(text);
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
  }

  private Row row(String text) {
    Optional<List<String>> cells = cells(text);
    if (cells.isEmpty()) {
      return new Broken(Map.of(), at("broken quote"));
    }
    Map<String, String> texts = new LinkedHashMap<>();
    for (int k = 0; k < Math.min(header.size(), cells.get().size()); k++) {
      texts.put(header.get(k), cells.get().get(k));
    }
    if (cells.get().size() != header.size()) {
      return new Broken(
          texts, at(cells.get().size() + " cells under a header of " + header.size()));
    }
    Map<String, BigFraction> point = new LinkedHashMap<>();
    for (Map.Entry<String, String> e : texts.entrySet()) {
      Optional<BigFraction> value = ExactNumber.of(e.getValue());
      if (value.isEmpty()) {
        return new Broken(
            texts,
            at(
                "'"
                    + e.getValue()
                    + "' is no rational number for '"
                    + e.getKey()
                    + "'; write for example 3/2"));
      }
      point.put(e.getKey(), value.get());
    }
    return new Numbers(texts, point);
  }

  private String at(String error) {
    return "line " + line + ": " + error;
  }

  /** The cells of a line; empty if a quote is broken. */
  private static Optional<List<String>> cells(String text) {
    if (text.indexOf('"') < 0) {
      return Optional.of(plain(text));
    }
    try (CSVParser parser = CSVParser.parse(text, FORMAT)) {
      List<CSVRecord> records = parser.getRecords();
      return records.size() == 1 ? Optional.of(records.get(0).toList()) : Optional.empty();
    } catch (IOException | UncheckedIOException e) {
      return Optional.empty();
    }
  }

  /** The cells of a line without quotes: what stands between commas. */
  private static List<String> plain(String text) {
    List<String> out = new ArrayList<>();
    int begin = 0;
    for (int comma = text.indexOf(','); comma >= 0; comma = text.indexOf(',', begin)) {
      out.add(text.substring(begin, comma).strip());
      begin = comma + 1;
    }
    out.add(text.substring(begin).strip());
    return out;
  }
}
