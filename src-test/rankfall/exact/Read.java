package rankfall.exact;

import java.math.BigInteger;

/** Reads polynomials that tests write as text: integers, names, {@code + - * ^ ( )}. */
public final class Read {
  private final Variables ring;
  private final String text;
  private int at;

  private Read(Variables ring, String text) {
    this.ring = ring;
    this.text = text.replace(" ", "");
  }

  /** The polynomial that a text means. */
  public static Polynomial polynomial(Variables ring, String text) {
    Read r = new Read(ring, text);
    Polynomial p = r.sum();
    if (r.at != r.text.length()) {
      throw new IllegalArgumentException("cannot read " + text + " after " + r.at);
    }
    return p;
  }

  private boolean accept(char c) {
    boolean yes = at < text.length() && text.charAt(at) == c;
    at += yes ? 1 : 0;
    return yes;
  }

  private Polynomial sum() {
    Polynomial p = accept('-') ? product().negate() : product();
    while (at < text.length() && (text.charAt(at) == '+' || text.charAt(at) == '-')) {
      p = text.charAt(at++) == '+' ? p.plus(product()) : p.minus(product());
    }
    return p;
  }

  private Polynomial product() {
    Polynomial p = power();
    while (accept('*')) {
      p = p.times(power());
    }
    return p;
  }

  private Polynomial power() {
    Polynomial p = atom();
    return accept('^') ? p.pow(Integer.parseInt(word())) : p;
  }

  private Polynomial atom() {
    if (accept('(')) {
      Polynomial p = sum();
      if (!accept(')')) {
        throw new IllegalArgumentException("missing ) in " + text);
      }
      return p;
    }
    String w = word();
    return Character.isDigit(w.charAt(0))
        ? Polynomial.constant(ring, new BigInteger(w))
        : Polynomial.variable(ring, w);
  }

  private String word() {
    int from = at;
    while (at < text.length() && Character.isLetterOrDigit(text.charAt(at))) {
      at++;
    }
    return text.substring(from, at);
  }
}
