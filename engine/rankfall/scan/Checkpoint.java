package rankfall.scan;

import java.io.Closeable;
import java.io.IOException;
import java.nio.ByteBuffer;
import java.nio.channels.FileChannel;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardCopyOption;
import java.nio.file.StandardOpenOption;
import java.util.ArrayList;
import java.util.List;

/**
 * The log of the blocks that a scan has written: a text file beside the table, its name with {@code
 * .blocks} behind. It begins with the claim of the scan, a line each, ends a block with {@code done
 * END} and the whole with {@code complete}.
 */
public final class Checkpoint implements Closeable {
  private static final String TITLE = "rankfall scan blocks 1";
  private static final String DONE = "done ";
  private static final String COMPLETE = "complete";

  private final FileChannel log;
  private final long head;
  private final List<Long> ends;
  private boolean complete;

  private Checkpoint(FileChannel log, long head, List<Long> ends, boolean complete) {
    this.log = log;
    this.head = head;
    this.ends = ends;
    this.complete = complete;
  }

  /**
   * What tells one scan from another.
   *
   * @param lines a word and what it is, each
   */
  public record Claim(List<String> lines) {
    /** Copies the list. */
    public Claim {
      lines = List.copyOf(lines);
    }
  }

  /** A log belongs to another scan; the message is for the user. */
  public static final class Foreign extends IllegalArgumentException {
    private static final long serialVersionUID = 1L;

    Foreign(String message) {
      super(message);
    }
  }

  /** The log of a table. */
  static Path beside(Path table) {
    return table.resolveSibling(table.getFileName() + ".blocks");
  }

  /** Begins a log anew. */
  static Checkpoint begin(Path table, Claim claim) throws IOException {
    Path path = beside(table);
    Path part = path.resolveSibling(path.getFileName() + ".part");
    Files.deleteIfExists(path);
    Files.deleteIfExists(table);
    Files.write(part, head(claim));
    Files.move(part, path, StandardCopyOption.ATOMIC_MOVE, StandardCopyOption.REPLACE_EXISTING);
    return new Checkpoint(open(path), head(claim).length, new ArrayList<>(), false);
  }

  private static byte[] head(Claim claim) {
    return (TITLE + "\n" + String.join("\n", claim.lines) + "\n").getBytes(StandardCharsets.UTF_8);
  }

  private static FileChannel open(Path path) throws IOException {
    FileChannel log = FileChannel.open(path, StandardOpenOption.WRITE);
    log.position(log.size());
    return log;
  }

  /**
   * Goes on with a log; begins anew where there is none.
   *
   * @throws Foreign if it is that of another scan
   */
  static Checkpoint resume(Path table, Claim claim) throws IOException {
    Path path = beside(table);
    if (!Files.exists(path)) {
      return begin(table, claim);
    }
    String text = Files.readString(path);
    int whole = text.lastIndexOf('\n') + 1;
    List<String> lines = text.substring(0, whole).lines().toList();
    check(path, lines, claim);
    List<Long> ends = new ArrayList<>();
    boolean complete = false;
    for (String line : lines.subList(claim.lines.size() + 1, lines.size())) {
      if (line.startsWith(DONE)) {
        ends.add(Long.parseLong(line.substring(DONE.length())));
      }
      complete = line.equals(COMPLETE);
    }
    FileChannel log = open(path);
    log.truncate(text.substring(0, whole).getBytes(StandardCharsets.UTF_8).length);
    return new Checkpoint(log, head(claim).length, ends, complete);
  }

  private static void check(Path path, List<String> lines, Claim claim) {
    List<String> wanted = new ArrayList<>(List.of(TITLE));
    wanted.addAll(claim.lines);
    for (int k = 0; k < wanted.size(); k++) {
      String found = k < lines.size() ? lines.get(k) : "nothing";
      if (!found.equals(wanted.get(k))) {
        throw new Foreign(
            "'"
                + path
                + "' is the log of another scan: it says '"
                + found
                + "', this call '"
                + wanted.get(k)
                + "'; name another file, or leave --resume out to begin anew");
      }
    }
  }

  /** Forgets blocks that are not wholly in a table of the given size. */
  void backTo(long size) throws IOException {
    if (end() <= size) {
      return;
    }
    while (end() > size) {
      ends.remove(ends.size() - 1);
    }
    complete = false;
    StringBuilder kept = new StringBuilder();
    for (long e : ends) {
      kept.append(DONE).append(e).append('\n');
    }
    log.truncate(head);
    put(kept.toString());
  }

  private void put(String line) throws IOException {
    ByteBuffer bytes = ByteBuffer.wrap(line.getBytes(StandardCharsets.UTF_8));
    while (bytes.hasRemaining()) {
      log.write(bytes);
    }
  }

  /** How many blocks are written. */
  long blocks() {
    return ends.size();
  }

  /** Where the last block ends. */
  long end() {
    return ends.isEmpty() ? 0 : ends.get(ends.size() - 1);
  }

  /** Whether all is written. */
  boolean complete() {
    return complete;
  }

  /** Logs a block. */
  void block(long end) throws IOException {
    long before = log.position();
    try {
      put(DONE + end + "\n");
      ends.add(end);
    } catch (IOException e) {
      log.truncate(before);
      throw e;
    }
  }

  /** Logs that all is written. */
  void finish() throws IOException {
    put(COMPLETE + "\n");
    complete = true;
  }

  @Override
  public void close() throws IOException {
    log.close();
  }
}
