package rankfall.report;

import java.io.BufferedReader;
import java.io.IOException;
import java.io.Reader;
import java.io.UncheckedIOException;
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
import rankfall.PointResult;
import rankfall.Points;
import rankfall.spec.ExactNumber;

/**
 * A table of points as CSV, its header the names of parameters or of functions such as {@code
 * cos(t)}.
 *
 * <p>A point is a line: a quoted cell does not hold a line end, so that a broken quote spoils its
 * own row only. Empty lines are passed over; a byte order mark may stand in front.
 */
public final class PointTable implements Iterator<PointResult> {
  private static final CSVFormat FORMAT =
      CSVFormat.RFC4180.builder().setIgnoreSurroundingSpaces(true).get();
  private static final String BYTE_ORDER_MARK = "\uFEFF";

  private final Points points;
  private final BufferedReader lines;
  private List<String> header = List.of();
  private Optional<String> next = Optional.empty();
  private int line;

  private PointTable(Points points, BufferedReader lines) {
    this.points = points;
    this.lines = lines;
  }

  /**
   * Reads a table row by row.
   *
   * @param points the family that is asked
   * @param table the text; stays open
   * @return the answers in the order of the rows; they throw {@link UncheckedIOException} if the
   *     table cannot be read on
   * @throws IOException if the table cannot be read
   * @throws IllegalArgumentException if the header does not determine points of the family
   */
  public static Iterator<PointResult> answers(Points points, Reader table) throws IOException {
    PointTable out = new PointTable(points, new BufferedReader(table));
    try {
      out.readHeader();
    } catch (UncheckedIOException e) {
      throw e.getCause();
    }
    return out;
  }

  private void readHeader() {
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
    Optional<String> misfit = points.misfit(header);
    if (misfit.isPresent()) {
      throw new IllegalArgumentException("the header of the table: " + misfit.get());
    }
    advance();
  }

  @Override
  public boolean hasNext() {
    return next.isPresent();
  }

  @Override
  public PointResult next() {
    String row = next.orElseThrow(NoSuchElementException::new);
    PointResult out = answer(row);
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

  private PointResult answer(String row) {
    Optional<List<String>> cells = cells(row);
    if (cells.isEmpty()) {
      return points.unreadable(Map.of(), at("broken quote"));
    }
    Map<String, String> texts = new LinkedHashMap<>();
    for (int k = 0; k < Math.min(header.size(), cells.get().size()); k++) {
      texts.put(header.get(k), cells.get().get(k));
    }
    if (cells.get().size() != header.size()) {
      return points.unreadable(
          texts, at(cells.get().size() + " cells under a header of " + header.size()));
    }
    Map<String, BigFraction> point = new LinkedHashMap<>();
    for (Map.Entry<String, String> e : texts.entrySet()) {
      Optional<BigFraction> value = ExactNumber.of(e.getValue());
      if (value.isEmpty()) {
        return points.unreadable(
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
    return points.at(point);
  }

  private String at(String error) {
    return "line " + line + ": " + error;
  }

  /** The cells of a line; empty if a quote is broken. */
  private static Optional<List<String>> cells(String text) {
    try (CSVParser parser = CSVParser.parse(text, FORMAT)) {
      List<CSVRecord> records = parser.getRecords();
      return records.size() == 1 ? Optional.of(records.get(0).toList()) : Optional.empty();
    } catch (IOException | UncheckedIOException e) {
      return Optional.empty();
    }
  }
}
