package rankfall.report;

import java.io.BufferedReader;
import java.io.IOException;
import java.io.InputStream;
import java.io.InputStreamReader;
import java.io.Reader;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.security.DigestInputStream;
import java.security.MessageDigest;
import java.security.NoSuchAlgorithmException;
import java.util.ArrayList;
import java.util.HexFormat;
import java.util.List;
import java.util.Optional;
import rankfall.scan.PointList;

/**
 * A file that holds a table of points, looked through once.
 *
 * @param path where it is
 * @param header the names of its columns
 * @param rows how many points
 * @param sha256 hexadecimal SHA-256 of its bytes
 */
public record PointFile(Path path, List<String> header, long rows, String sha256) {
  /** Copies the header. */
  public PointFile {
    header = List.copyOf(header);
  }

  /**
   * Looks through a file.
   *
   * @param path of a CSV table whose header names values of points
   * @throws IOException if it cannot be read
   * @throws IllegalArgumentException if it has no good header; the message is for the user
   */
  public static PointFile of(Path path) throws IOException {
    MessageDigest digest = newDigest();
    long rows = -1;
    try (InputStream in = new DigestInputStream(Files.newInputStream(path), digest);
        BufferedReader lines =
            new BufferedReader(new InputStreamReader(in, StandardCharsets.UTF_8))) {
      for (String line = lines.readLine(); line != null; line = lines.readLine()) {
        rows += line.isBlank() ? 0 : 1;
      }
    }
    try (Reader table = Files.newBufferedReader(path)) {
      List<String> header = new PointRows(table).header();
      return new PointFile(path, header, rows, HexFormat.of().formatHex(digest.digest()));
    }
  }

  /**
   * Opens the points for reading.
   *
   * @param table the text of the file; stays open as long as points are read
   * @param names the columns, in the order in which values are wanted
   */
  public PointList points(Reader table, List<String> names) {
    PointRows read = new PointRows(table);
    return new PointList(
        names,
        rows,
        "list of " + rows + " points " + sha256,
        count -> {
          List<PointList.Row> out = new ArrayList<>();
          while (out.size() < count && read.hasNext()) {
            out.add(row(read.next(), names));
          }
          return out;
        });
  }

  private static PointList.Row row(PointRows.Row row, List<String> names) {
    List<String> texts = names.stream().map(n -> row.texts().getOrDefault(n, "")).toList();
    return new PointList.Row(
        texts,
        row instanceof PointRows.Numbers n
            ? Optional.of(names.stream().map(n.values()::get).toList())
            : Optional.empty());
  }

  private static MessageDigest newDigest() {
    try {
      return MessageDigest.getInstance("SHA-256");
    } catch (NoSuchAlgorithmException e) {
      throw new IllegalStateException("every Java platform has SHA-256", e);
    }
  }
}
