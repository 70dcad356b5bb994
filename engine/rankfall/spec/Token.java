package rankfall.spec;

/** A token of an expression; {@code from <= k < to} are its code points in the text. */
record Token(Kind kind, String text, int from, int to) {
  enum Kind {
    NUMBER,
    NAME,
    SYMBOL,
    END
  }

  boolean is(String symbol) {
    return kind == Kind.SYMBOL && text.equals(symbol);
  }
}
