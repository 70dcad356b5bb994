package rankfall.scan;

import static java.nio.charset.StandardCharsets.UTF_8;
import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.ByteArrayInputStream;
import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.nio.ByteBuffer;
import java.nio.channels.FileChannel;
import java.nio.channels.SeekableByteChannel;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardOpenOption;
import java.util.List;
import java.util.Random;
import java.util.zip.GZIPInputStream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** The file of a scan is the same to the byte however it came about. */
final class ScanFileTest {
  private static final Grid SMALL =
      new Grid(List.copyOf(GridText.grid("a=-1:1:401,b=0:1:500").values()));

  @TempDir private Path folder;

  @ParameterizedTest
  @ValueSource(strings = {"x.csv", "x.csv.gz"})
  void killedTenTimesAndResumedItIsTheSame(String name) throws IOException, InterruptedException {
    Path whole = folder.resolve("whole-" + name);
    ScanChild.write(whole, ScanChild.GRID, 2, false);
    byte[] wanted = Files.readAllBytes(whole);
    Path killed = folder.resolve(name);
    Random random = new Random(name.hashCode());
    long size = 0;
    for (int kill = 0; kill < 10; kill++) {
      long until = Math.min(wanted.length - 1, size + random.nextInt(wanted.length / 11));
      Process child = start(killed);
      while (child.isAlive() && size(killed) <= until) {
        Thread.onSpinWait();
      }
      child.destroyForcibly().waitFor();
      size = size(killed);
    }
    assertTrue(size > wanted.length / 20, "the kills came after some blocks");
    ScanChild.write(killed, ScanChild.GRID, 1, true);
    assertArrayEquals(wanted, Files.readAllBytes(killed));
  }

  private static long size(Path path) throws IOException {
    return Files.exists(path) ? Files.size(path) : 0;
  }

  private static Process start(Path path) throws IOException {
    return new ProcessBuilder(
            Path.of(System.getProperty("java.home"), "bin", "java").toString(),
            "-Xmx256m",
            "-cp",
            System.getProperty("java.class.path"),
            ScanChild.class.getName(),
            path.toString())
        .inheritIO()
        .start();
  }

  @ParameterizedTest
  @ValueSource(ints = {2, 7})
  void theNumberOfThreadsChangesNoByte(int threads) throws IOException, InterruptedException {
    ScanChild.write(folder.resolve("1.csv"), SMALL, 1, false);
    ScanChild.write(folder.resolve("n.csv"), SMALL, threads, false);
    assertEquals(-1, Files.mismatch(folder.resolve("1.csv"), folder.resolve("n.csv")));
    ScanChild.write(folder.resolve("1.csv.gz"), SMALL, 1, false);
    ScanChild.write(folder.resolve("n.csv.gz"), SMALL, threads, false);
    assertEquals(-1, Files.mismatch(folder.resolve("1.csv.gz"), folder.resolve("n.csv.gz")));
  }

  @Test
  void partsPutTogetherAreTheWhole() throws IOException, InterruptedException {
    ScanChild.write(folder.resolve("whole.csv"), SMALL, 2, false);
    ByteArrayOutputStream plain = new ByteArrayOutputStream();
    ByteArrayOutputStream zipped = new ByteArrayOutputStream();
    for (int k = 1; k <= 5; k++) {
      Path part = folder.resolve(k + ".csv");
      ScanChild.write(part, SMALL, new Shard(k, 5), 2, false);
      plain.write(Files.readAllBytes(part));
      Path zip = folder.resolve(k + ".csv.gz");
      ScanChild.write(zip, SMALL, new Shard(k, 5), 2, false);
      zipped.write(Files.readAllBytes(zip));
    }
    byte[] whole = Files.readAllBytes(folder.resolve("whole.csv"));
    assertArrayEquals(whole, plain.toByteArray());
    assertArrayEquals(
        whole, new GZIPInputStream(new ByteArrayInputStream(zipped.toByteArray())).readAllBytes());
  }

  /** Rows by hand: so(3) for a > 0, sl(2,R) for a < 0; see {@link HandMade}. */
  @Test
  void rowsSayWhatIsKnown() throws IOException, InterruptedException {
    Path path = folder.resolve("rows.csv");
    ScanChild.write(
        path, new Grid(List.copyOf(GridText.grid("a=-1/2:1/2:3,b=1").values())), 1, false);
    assertEquals(
        "a,b,a_decimal,b_decimal,status,dimension,rank,plus,minus,zero,stratum,region,type\r\n"
            + "-1/2,1,-0.5,1,ok,3,3,2,1,0,S1,R1,\r\n"
            + "0,1,0,1,ok,3,1,0,1,2,S2,R1,\r\n"
            + "1/2,1,0.5,1,ok,3,3,0,3,0,S1,R2,\r\n",
        Files.readString(path));
  }

  @Test
  void anotherScanIsNotGoneOnWith() throws IOException, InterruptedException {
    Path path = folder.resolve("x.csv");
    ScanChild.write(path, SMALL, 1, false);
    byte[] before = Files.readAllBytes(path);
    Checkpoint.Foreign refused =
        assertThrows(
            Checkpoint.Foreign.class, () -> ScanChild.write(path, ScanChild.GRID, 1, true));
    assertTrue(refused.getMessage().contains("a=-1:1:401"), refused.getMessage());
    assertTrue(refused.getMessage().contains("a=-1:1:2001"), refused.getMessage());
    assertArrayEquals(before, Files.readAllBytes(path));
    ScanChild.write(path, SMALL, 1, true);
    assertArrayEquals(before, Files.readAllBytes(path));
  }

  @Test
  void aTableShorterThanItsLogIsGoneOnWithWhereItEnds() throws IOException, InterruptedException {
    Path path = folder.resolve("x.csv");
    ScanChild.write(path, SMALL, 2, false);
    byte[] wanted = Files.readAllBytes(path);
    try (FileChannel file = FileChannel.open(path, StandardOpenOption.WRITE)) {
      file.truncate(wanted.length / 2);
    }
    ScanChild.write(path, SMALL, 2, true);
    assertArrayEquals(wanted, Files.readAllBytes(path));
  }

  @Test
  void whereNothingMoreCanBeWrittenTheRowsAreWhole() throws IOException {
    Path path = folder.resolve("x.csv");
    Checkpoint.Claim claim = new Checkpoint.Claim(List.of("points few"));
    byte[] rows = "1,2\r\n3,4\r\n".repeat(1000).getBytes(UTF_8);
    Checkpoint log = Checkpoint.begin(path, claim);
    try (FileChannel disk =
            FileChannel.open(path, StandardOpenOption.CREATE, StandardOpenOption.WRITE);
        ScanFile file = new ScanFile(new Full(disk, 25_000), log, false)) {
      file.append(rows);
      file.append(rows);
      IOException full = assertThrows(IOException.class, () -> file.append(rows));
      assertEquals("no space left", full.getMessage());
      assertEquals(2, file.blocks());
      assertFalse(file.complete());
    }
    assertEquals(2L * rows.length, Files.size(path));
  }

  /** A disk that takes so many bytes. */
  private record Full(SeekableByteChannel disk, long room) implements SeekableByteChannel {
    @Override
    public int write(ByteBuffer bytes) throws IOException {
      if (disk.position() + bytes.remaining() > room) {
        throw new IOException("no space left");
      }
      return disk.write(bytes);
    }

    @Override
    public int read(ByteBuffer to) throws IOException {
      return disk.read(to);
    }

    @Override
    public long position() throws IOException {
      return disk.position();
    }

    @Override
    public SeekableByteChannel position(long to) throws IOException {
      disk.position(to);
      return this;
    }

    @Override
    public long size() throws IOException {
      return disk.size();
    }

    @Override
    public SeekableByteChannel truncate(long to) throws IOException {
      disk.truncate(to);
      return this;
    }

    @Override
    public boolean isOpen() {
      return disk.isOpen();
    }

    @Override
    public void close() throws IOException {
      disk.close();
    }
  }
}
