package rankfall.spec;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;

/** Cuts a text, or one line of it, into tokens. */
final class Tokenizer {
  /** A longer expression is refused. */
  static final int MAX_TOKENS = 200_000;

  private static final List<String> LONG_SYMBOLS = List.of("!=", "<=", ">=");
  private static final String SHORT_SYMBOLS = "+-*/^()[],=<>";

  /** What people write instead, and what this format has for it. */
  private static final Map<String, String> INSTEAD =
      Map.ofEntries(
          Map.entry("**", "^"),
          Map.entry("==", "="),
          Map.entry("=<", "<="),
          Map.entry("=>", ">="),
          Map.entry("<>", "!="),
          Map.entry("\u2212", "-"),
          Map.entry("\u2013", "-"),
          Map.entry("\u00b7", "*"),
          Map.entry("\u22c5", "*"),
          Map.entry("\u00d7", "*"),
          Map.entry("\u00f7", "/"),
          Map.entry("\u2260", "!="),
          Map.entry("\u2264", "<="),
          Map.entry("\u2265", ">="));

  private final ScalarText text;
  private final int end;
  private int at;

  private Tokenizer(ScalarText text, int from, int to) {
    this.text = text;
    this.at = from;
    this.end = to;
  }

  /** The tokens of the code points {@code from <= k < to}; the last one is END. */
  static List<Token> tokens(ScalarText text, int from, int to) {
    Tokenizer tokenizer = new Tokenizer(text, from, to);
    List<Token> tokens = new ArrayList<>();
    while (tokenizer.skipBlanks()) {
      if (tokens.size() == MAX_TOKENS) {
        throw SpecFault.of(
            text.place(tokenizer.at, tokenizer.at + 1),
            "an expression of over " + MAX_TOKENS + " numbers, names and signs",
            "give parts of it names under 'abbreviations'");
      }
      tokens.add(tokenizer.next());
    }
    tokens.add(new Token(Token.Kind.END, "", to, to));
    return tokens;
  }

  private boolean skipBlanks() {
    while (at < end && Character.isWhitespace(text.at(at))) {
      at++;
    }
    return at < end;
  }

  private Token next() {
    int from = at;
    if (Names.startsName(text.at(at))) {
      while (at < end && Names.continuesName(text.at(at))) {
        at++;
      }
      return token(Token.Kind.NAME, from);
    }
    if (isDigit(at) || (text.at(at) == '.' && isDigit(at + 1))) {
      number();
      return token(Token.Kind.NUMBER, from);
    }
    return symbol(from);
  }

  /** Digits, then a fraction, then a power of ten where digits follow the letter. */
  private void number() {
    digits();
    if (at < end && text.at(at) == '.') {
      at++;
      digits();
    }
    if (at < end && (text.at(at) == 'e' || text.at(at) == 'E')) {
      int power = at + 1;
      if (power < end && (text.at(power) == '+' || text.at(power) == '-')) {
        power++;
      }
      if (isDigit(power)) {
        at = power;
        digits();
      }
    }
  }

  private void digits() {
    while (isDigit(at)) {
      at++;
    }
  }

  private boolean isDigit(int index) {
    return index < end && text.at(index) >= '0' && text.at(index) <= '9';
  }

  private Token symbol(int from) {
    String two = text.slice(from, Math.min(end, from + 2));
    String one = text.slice(from, from + 1);
    if (INSTEAD.containsKey(two) || INSTEAD.containsKey(one)) {
      String found = INSTEAD.containsKey(two) ? two : one;
      throw SpecFault.of(
          text.place(from, from + found.codePointCount(0, found.length())),
          "'" + found + "' is not read",
          "write '" + INSTEAD.get(found) + "'");
    }
    if (LONG_SYMBOLS.contains(two)) {
      at += 2;
    } else if (SHORT_SYMBOLS.contains(one)) {
      at++;
    } else {
      throw SpecFault.of(
          text.place(from, from + 1), "the character '" + one + "' has no meaning here");
    }
    return token(Token.Kind.SYMBOL, from);
  }

  private Token token(Token.Kind kind, int from) {
    return new Token(kind, text.slice(from, at), from, at);
  }
}
