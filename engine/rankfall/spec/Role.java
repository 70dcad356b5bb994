package rankfall.spec;

/** What a name of a spec stands for. */
enum Role {
  PARAMETER("a parameter"),
  CONSTANT("a constant"),
  ABBREVIATION("an abbreviation"),
  GENERATOR("a generator"),
  MATRIX("a matrix");

  private final String phrase;

  Role(String phrase) {
    this.phrase = phrase;
  }

  String phrase() {
    return phrase;
  }

  boolean isScalar() {
    return this != GENERATOR && this != MATRIX;
  }
}
