package rankfall.scan;

import java.io.Closeable;
import java.io.IOException;
import java.nio.ByteBuffer;
import java.nio.channels.FileChannel;
import java.nio.file.Path;
import java.nio.file.StandardOpenOption;

/**
 * The file that a scan writes, with the log of its blocks beside it.
 *
 * <p>A block is written, then logged; what an interrupted run wrote and did not log is cut off when
 * the scan goes on. Text is handed to the system row by row at the borders of memory pages, and by
 * whole pages between them, so that a killed process leaves whole rows (common practice, no source:
 * the kernel ends a write for a kill between pages only; a row that lies across a border can be cut
 * if the kill comes while that one row is copied).
 */
public final class ScanFile implements Closeable {
  private static final int PAGE = 4096;

  private final FileChannel data;
  private final Checkpoint log;
  private final boolean zipped;
  private long end;

  private ScanFile(FileChannel data, Checkpoint log, boolean zipped, long end) {
    this.data = data;
    this.log = log;
    this.zipped = zipped;
    this.end = end;
  }

  /**
   * Opens the file.
   *
   * @param path of the table; the name ends in {@code .gz} if the blocks are compressed
   * @param claim what tells this scan from others
   * @param resume whether to go on where an earlier run of the same scan stopped; without a log the
   *     scan begins anew
   * @throws Checkpoint.Foreign if the log is that of another scan
   * @throws IOException if a file cannot be opened or written
   */
  public static ScanFile open(Path path, Checkpoint.Claim claim, boolean resume)
      throws IOException {
    Checkpoint log = resume ? Checkpoint.resume(path, claim) : Checkpoint.begin(path, claim);
    FileChannel data = FileChannel.open(path, StandardOpenOption.CREATE, StandardOpenOption.WRITE);
    log.backTo(data.size());
    data.truncate(log.end());
    data.position(log.end());
    return new ScanFile(data, log, path.toString().endsWith(".gz"), log.end());
  }

  /** How many blocks are written. */
  public long blocks() {
    return log.blocks();
  }

  /** Whether all is written. */
  public boolean complete() {
    return log.complete();
  }

  /**
   * Appends the next block.
   *
   * @param rows whole rows, or a whole gzip member
   * @throws IOException if they cannot be written; the file then ends with the block before
   */
  public void append(byte[] rows) throws IOException {
    try {
      write(rows);
      log.block(end + rows.length);
      end += rows.length;
    } catch (IOException e) {
      data.truncate(end);
      throw e;
    }
  }

  private void write(byte[] rows) throws IOException {
    int begin = 0;
    while (begin < rows.length) {
      int stop = zipped ? rows.length : stop(rows, begin);
      ByteBuffer piece = ByteBuffer.wrap(rows, begin, stop - begin);
      while (piece.hasRemaining()) {
        data.write(piece);
      }
      begin = stop;
    }
  }

  /**
   * Where a write ends: after the last row that ends on the page of its beginning, or after one.
   */
  private int stop(byte[] rows, int begin) {
    long onPage = PAGE - (end + begin) % PAGE;
    int border = (int) Math.min(rows.length, begin + onPage);
    for (int k = border; k > begin; k--) {
      if (rows[k - 1] == '\n') {
        return k;
      }
    }
    int k = border;
    while (k < rows.length && rows[k - 1] != '\n') {
      k++;
    }
    return k;
  }

  /** Notes that all is written. */
  public void finish() throws IOException {
    data.force(true);
    log.finish();
  }

  @Override
  public void close() throws IOException {
    try {
      data.close();
    } finally {
      log.close();
    }
  }
}
