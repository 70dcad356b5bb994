package rankfall.spec;

import java.nio.ByteBuffer;
import java.nio.charset.CharacterCodingException;
import java.nio.charset.CodingErrorAction;
import java.nio.charset.StandardCharsets;
import java.security.MessageDigest;
import java.security.NoSuchAlgorithmException;
import java.util.ArrayList;
import java.util.HexFormat;
import java.util.List;
import java.util.Optional;

/** The text of one file by lines; columns count code points, as {@link Place} does. */
final class FileText {
  /** The largest file that is read, in bytes. */
  static final int MAX_BYTES = 4 * 1024 * 1024;

  private final String name;
  private final String text;
  private final String sha256;
  private final List<String> lines;
  private final List<Integer> starts;
  private final List<int[]> points;

  private FileText(String name, String text, String sha256) {
    this.name = name;
    this.text = text;
    this.sha256 = sha256;
    List<String> cut = new ArrayList<>();
    List<Integer> offsets = new ArrayList<>();
    int from = 0;
    for (int at = 0; at < text.length(); at++) {
      char c = text.charAt(at);
      if (c == '\n' || c == '\r') {
        offsets.add(from);
        cut.add(text.substring(from, at));
        if (c == '\r' && at + 1 < text.length() && text.charAt(at + 1) == '\n') {
          at++;
        }
        from = at + 1;
      }
    }
    if (from < text.length() || cut.isEmpty()) {
      offsets.add(from);
      cut.add(text.substring(from));
    }
    lines = List.copyOf(cut);
    starts = List.copyOf(offsets);
    points = lines.stream().map(line -> line.codePoints().toArray()).toList();
  }

  /**
   * Decodes a file.
   *
   * @throws SpecFault if it is too large, is not UTF-8 or holds control characters; its place then
   *     belongs to {@link #undecoded}
   */
  static FileText of(String name, byte[] bytes) {
    Place start = new Place(name, 1, 1, 1);
    if (bytes.length > MAX_BYTES) {
      throw SpecFault.of(
          start, "the file has " + bytes.length + " bytes", "at most 4 MiB are read");
    }
    String text;
    try {
      text =
          StandardCharsets.UTF_8
              .newDecoder()
              .onMalformedInput(CodingErrorAction.REPORT)
              .onUnmappableCharacter(CodingErrorAction.REPORT)
              .decode(ByteBuffer.wrap(bytes))
              .toString();
    } catch (CharacterCodingException e) {
      throw SpecFault.of(start, "the file is not UTF-8", "save it in that encoding");
    }
    return new FileText(name, text.startsWith("\uFEFF") ? text.substring(1) : text, hash(bytes));
  }

  /** A diagnostic on a file whose text could not be had. */
  static Diagnostic undecoded(SpecFault fault) {
    return new Diagnostic(fault.place(), "", fault.getMessage(), fault.advice());
  }

  private static String hash(byte[] bytes) {
    try {
      return HexFormat.of().formatHex(MessageDigest.getInstance("SHA-256").digest(bytes));
    } catch (NoSuchAlgorithmException e) {
      throw new IllegalStateException("every Java platform has SHA-256", e);
    }
  }

  String name() {
    return name;
  }

  String sha256() {
    return sha256;
  }

  List<String> lines() {
    return lines;
  }

  int lineCount() {
    return lines.size();
  }

  /** The text from the start of a line, counted from 0, to the end of the file. */
  String from(int line) {
    return text.substring(starts.get(line));
  }

  int lengthOf(int line) {
    return points.get(line).length;
  }

  /** The code point at a place counted from 0. */
  int at(int line, int column) {
    return points.get(line)[column];
  }

  /** A place from numbers counted from 0; what lies behind the end is moved to the end. */
  Place place(int line, int column, int length) {
    if (line >= lines.size()) {
      int last = lines.size() - 1;
      return new Place(name, last + 1, lengthOf(last) + 1, 1);
    }
    int first = Math.min(column, lengthOf(line));
    return new Place(
        name, line + 1, first + 1, Math.max(1, Math.min(length, lengthOf(line) - first)));
  }

  Diagnostic diagnostic(SpecFault fault) {
    String line = lines.get(fault.place().line() - 1);
    return new Diagnostic(
        fault.place(), line, oneLine(fault.getMessage()), fault.advice().map(FileText::oneLine));
  }

  /** Names in a message may hold line ends, where a key is quoted. */
  private static String oneLine(String message) {
    return message.replaceAll("\\R|\t", " ");
  }

  /** The first character that YAML does not allow, if there is one. */
  Optional<Place> firstControlCharacter() {
    for (int line = 0; line < points.size(); line++) {
      int[] row = points.get(line);
      for (int column = 0; column < row.length; column++) {
        if (!allowed(row[column])) {
          return Optional.of(place(line, column, 1));
        }
      }
    }
    return Optional.empty();
  }

  /** YAML 1.2.2, rule 1: c-printable, without line ends. */
  private static boolean allowed(int c) {
    return c == '\t'
        || (c >= 0x20 && c <= 0x7E)
        || c == 0x85
        || (c >= 0xA0 && c <= 0xD7FF)
        || (c >= 0xE000 && c <= 0xFFFD && c != 0xFEFF)
        || c >= 0x10000;
  }
}
