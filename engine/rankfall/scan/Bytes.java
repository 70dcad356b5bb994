package rankfall.scan;

import java.nio.charset.StandardCharsets;
import java.util.Arrays;

/** Bytes that are appended to. */
final class Bytes {
  private byte[] bytes = new byte[1 << 16];
  private int size;

  void append(byte[] more) {
    int end = size + more.length;
    if (end > bytes.length) {
      bytes = Arrays.copyOf(bytes, Math.max(end, 2 * bytes.length));
    }
    System.arraycopy(more, 0, bytes, size, more.length);
    size = end;
  }

  void append(byte one) {
    if (size == bytes.length) {
      bytes = Arrays.copyOf(bytes, 2 * bytes.length);
    }
    bytes[size++] = one;
  }

  /** All of them; they are forgotten. */
  byte[] take() {
    byte[] out = Arrays.copyOf(bytes, size);
    size = 0;
    return out;
  }

  static byte[] of(String text) {
    return text.getBytes(StandardCharsets.UTF_8);
  }
}
