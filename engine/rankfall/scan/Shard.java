package rankfall.scan;

/**
 * A part of a sequence of points; the parts one after the other are the whole.
 *
 * @param part from 1
 * @param parts how many
 */
public record Shard(int part, int parts) {
  /** The whole. */
  public static final Shard WHOLE = new Shard(1, 1);

  /**
   * Checks the numbers.
   *
   * @throws IllegalArgumentException if there is no such part
   */
  public Shard {
    if (part < 1 || part > parts) {
      throw new IllegalArgumentException(
          "there is no part " + part + " of " + parts + "; parts count from 1");
    }
  }

  /**
   * Reads {@code 3/64}.
   *
   * @param text as written
   * @throws IllegalArgumentException if it is no part; the message is for the user
   */
  public static Shard of(String text) {
    if (!text.matches("[0-9]{1,9}/[0-9]{1,9}")) {
      throw new IllegalArgumentException("'" + text + "' is no part; write for example 3/64");
    }
    int slash = text.indexOf('/');
    return new Shard(
        Integer.parseInt(text.substring(0, slash)), Integer.parseInt(text.substring(slash + 1)));
  }

  /** The number of its first point. */
  public long from(long size) {
    return border(size, part - 1);
  }

  /** The number after its last point. */
  public long to(long size) {
    return border(size, part);
  }

  private long border(long size, int before) {
    return size / parts * before + size % parts * before / parts;
  }

  @Override
  public String toString() {
    return part + "/" + parts;
  }
}
