package rankfall.scan;

import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.util.ArrayDeque;
import java.util.List;
import java.util.Queue;
import java.util.concurrent.ConcurrentLinkedQueue;
import java.util.concurrent.ExecutionException;
import java.util.concurrent.ExecutorService;
import java.util.concurrent.Executors;
import java.util.concurrent.Future;
import java.util.zip.GZIPOutputStream;

/**
 * Goes through points block by block on several threads; what comes out is handed on in the order
 * of the points, whatever the number of threads. Only a few blocks are held at a time.
 *
 * @param plan what is scanned
 * @param from number of the first point
 * @param to number after the last point
 * @param threads how many
 */
public record ScanRun(ScanPlan plan, long from, long to, int threads) {
  /** How many points a block has; the last one may have fewer. */
  public static final int BLOCK = 1 << 15;

  /** Takes what came out of the blocks, in their order, on the thread that runs the scan. */
  @FunctionalInterface
  public interface Sink {
    /** Takes one block. */
    void take(ScanPart part) throws IOException;
  }

  /**
   * What is said of each point of a small lattice, in order, on this thread.
   *
   * @param plan whose points form a lattice
   */
  public static List<Finding> each(ScanPlan plan) {
    return new ScanWorker(plan).each((Lattice) plan.points());
  }

  /**
   * The tally of all points, on this thread.
   *
   * @param plan whose points form a lattice
   */
  public static Tally tally(ScanPlan plan) {
    Lattice lattice = (Lattice) plan.points();
    return new ScanWorker(plan)
        .work(new ScanBlock.Range(lattice, 0, lattice.size()), false)
        .tally();
  }

  /** How many blocks there are; the first points of all have one, were there none. */
  public long blocks() {
    long blocks = (to - from + BLOCK - 1) / BLOCK;
    return from == 0 ? Math.max(1, blocks) : blocks;
  }

  /**
   * Runs the scan.
   *
   * @param first the block to begin with, from 0
   * @param sink takes the blocks from there on
   * @throws IOException if the sink throws it
   * @throws InterruptedException if this thread is interrupted
   */
  public void run(long first, Sink sink) throws IOException, InterruptedException {
    ExecutorService pool = Executors.newFixedThreadPool(threads, ScanRun::daemon);
    Queue<ScanWorker> idle = new ConcurrentLinkedQueue<>();
    Queue<Future<ScanPart>> running = new ArrayDeque<>();
    try {
      skip(first);
      for (long block = first; block < blocks(); block++) {
        ScanBlock points = block(block);
        boolean withHeader = block == 0 && from == 0;
        running.add(pool.submit(() -> worked(idle, points, withHeader)));
        if (running.size() >= 2 * threads) {
          sink.take(await(running.remove()));
        }
      }
      while (!running.isEmpty()) {
        sink.take(await(running.remove()));
      }
    } finally {
      pool.shutdownNow();
    }
  }

  /** Passes over what a list holds before the first block. */
  private void skip(long first) {
    if (plan.points() instanceof PointList list) {
      long left = from + first * BLOCK;
      while (left > 0) {
        int passed = list.rows().next((int) Math.min(left, BLOCK)).size();
        left = passed == 0 ? 0 : left - passed;
      }
    }
  }

  private ScanBlock block(long block) {
    long begin = from + block * BLOCK;
    long end = Math.min(to, begin + BLOCK);
    return plan.points() instanceof Lattice lattice
        ? new ScanBlock.Range(lattice, begin, end)
        : new ScanBlock.Rows(((PointList) plan.points()).rows().next((int) (end - begin)));
  }

  private ScanPart worked(Queue<ScanWorker> idle, ScanBlock points, boolean withHeader)
      throws IOException {
    ScanWorker known = idle.poll();
    ScanWorker worker = known == null ? new ScanWorker(plan) : known;
    ScanPart part = worker.work(points, withHeader);
    idle.add(worker);
    boolean zipped = plan.table().map(ScanPlan.Table::zipped).orElse(false);
    return zipped ? new ScanPart(zipped(part.rows()), part.tally()) : part;
  }

  private static byte[] zipped(byte[] rows) throws IOException {
    ByteArrayOutputStream out = new ByteArrayOutputStream(rows.length / 4);
    try (GZIPOutputStream zip = new GZIPOutputStream(out)) {
      zip.write(rows);
    }
    return out.toByteArray();
  }

  private static ScanPart await(Future<ScanPart> part) throws IOException, InterruptedException {
    try {
      return part.get();
    } catch (ExecutionException e) {
      if (e.getCause() instanceof IOException io) {
        throw io;
      }
      throw new IllegalStateException(e.getCause().getMessage(), e.getCause());
    }
  }

  private static Thread daemon(Runnable task) {
    Thread thread = new Thread(task, "scan");
    thread.setDaemon(true);
    return thread;
  }
}
