package rankfall.spec;

import java.util.ArrayList;
import java.util.HashSet;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalInt;
import java.util.Set;

/**
 * Reads {@code matrices}: rows of entries, or combinations of matrix units and earlier matrices.
 */
final class MatrixReader {
  /** The largest order of matrices. */
  static final int MAX_ORDER = 1000;

  private final List<YamlNode.Entry> entries;
  private final Names names;
  private final boolean open;
  private final Faults faults;

  /**
   * Prepares the reading.
   *
   * @param names the scalar names; the names of the matrices are added
   * @param open whether unknown names are let through, because their list could not be read
   */
  MatrixReader(List<YamlNode.Entry> entries, Names names, boolean open, Faults faults) {
    this.entries = entries;
    this.names = names;
    this.open = open;
    this.faults = faults;
  }

  /**
   * Reads all matrices; what is faulty is left out.
   *
   * @param given what the key {@code order} says
   */
  Spec.Matrices read(Order given, Spec.Closure closure) {
    Map<String, Role> scalars = names.roles();
    Set<String> declared = declare();
    Order order = order(given);
    List<Spec.NamedMatrix> matrices = new ArrayList<>();
    Map<String, Role> earlier = new LinkedHashMap<>(scalars);
    Map<String, Role> later = new LinkedHashMap<>();
    entries.forEach(e -> later.put(e.name(), Role.MATRIX));
    for (YamlNode.Entry entry : entries) {
      int before = matrices.size();
      faults.gather(
          () ->
              body(entry, order, earlier, later)
                  .ifPresent(
                      body ->
                          matrices.add(
                              new Spec.NamedMatrix(entry.name(), body, entry.key().place()))));
      if (declared.contains(entry.name())) {
        earlier.put(entry.name(), Role.MATRIX);
        later.remove(entry.name());
      } else if (matrices.size() > before) {
        matrices.remove(before);
      }
    }
    return new Spec.Matrices(order.value().orElse(1), closure, List.copyOf(matrices));
  }

  private Set<String> declare() {
    Set<String> declared = new HashSet<>();
    for (YamlNode.Entry entry : entries) {
      faults.gather(
          () -> {
            names.declare(entry.name(), Role.MATRIX, entry.key().place());
            declared.add(entry.name());
          });
    }
    return declared;
  }

  /**
   * The order that all matrices have.
   *
   * @param value empty where it is not known
   * @param giver what gave it, as in "X has 3 rows"
   */
  record Order(OptionalInt value, String giver) {
    /** The key {@code order} is not there. */
    static Order unwritten() {
      return new Order(OptionalInt.empty(), "");
    }

    /** The key {@code order} is there with a faulty value. */
    static Order faulty() {
      return new Order(OptionalInt.empty(), "'order' is faulty");
    }

    /** The key {@code order} is there. */
    static Order written(int order) {
      return new Order(OptionalInt.of(order), "'order' is " + order);
    }
  }

  private Order order(Order given) {
    if (given.value().isPresent()) {
      return given;
    }
    for (YamlNode.Entry entry : entries) {
      if (entry.value() instanceof YamlNode.Sequence rows && !rows.items().isEmpty()) {
        int count = rows.items().size();
        return new Order(OptionalInt.of(count), entry.name() + " has " + count + " rows");
      }
    }
    if (given.equals(Order.unwritten())) {
      faults.add(
          entries.get(0).key().place(),
          "the order of the matrices is not known: none is written in rows",
          "add a line such as 'order: 3'");
    }
    return given;
  }

  private Optional<Spec.MatrixBody> body(
      YamlNode.Entry entry, Order order, Map<String, Role> earlier, Map<String, Role> later) {
    if (entry.value() instanceof YamlNode.Sequence rows) {
      Map<String, Role> known = new LinkedHashMap<>(earlier);
      known.putAll(later);
      Scope scope = Scope.ofScalars("an entry of " + entry.name(), known, open);
      return rows(entry, rows, order, scope);
    }
    String wanted = "rows such as [[0, 1], [-1, 0]] or a combination such as \"E(1,2) - E(2,1)\"";
    if (entry.isNull()) {
      throw SpecFault.of(entry.key().place(), entry.name() + " has no value", "write " + wanted);
    }
    ScalarText text = Scalars.text(entry.value(), wanted);
    Scope scope =
        Scope.ofScalars(entry.name(), earlier, open)
            .withLater(later)
            .withMatrices(order.value().orElse(MAX_ORDER));
    Expression value = ExpressionReader.read(text, scope);
    if (!open) {
      Linearity.check(value, scope, "matrices");
    }
    return Optional.of(new Spec.Combination(value));
  }

  private Optional<Spec.MatrixBody> rows(
      YamlNode.Entry entry, YamlNode.Sequence rows, Order order, Scope scope) {
    checkShape(entry.name(), rows, order);
    List<List<Expression>> result = new ArrayList<>();
    int[] read = {0};
    for (YamlNode row : rows.items()) {
      List<Expression> values = new ArrayList<>();
      for (YamlNode item : ((YamlNode.Sequence) row).items()) {
        faults.gather(
            () -> {
              ScalarText text = Scalars.text(item, "an entry such as 0 or -a");
              values.add(ExpressionReader.read(text, scope));
              read[0]++;
            });
      }
      result.add(List.copyOf(values));
    }
    boolean whole = read[0] == rows.items().size() * rows.items().size();
    return whole ? Optional.of(new Spec.Rows(List.copyOf(result))) : Optional.empty();
  }

  private static void checkShape(String name, YamlNode.Sequence rows, Order order) {
    int count = rows.items().size();
    if (count == 0) {
      throw SpecFault.of(
          rows.place(), name + " has no rows", "write rows such as [[0, 1], [-1, 0]]");
    }
    for (int k = 0; k < count; k++) {
      YamlNode node = rows.items().get(k);
      if (!(node instanceof YamlNode.Sequence row)) {
        throw SpecFault.of(
            node.place(),
            "row " + (k + 1) + " of " + name + " is " + node.kind(),
            "write rows in brackets, such as [[0, 1], [-1, 0]]");
      }
      int length = row.items().size();
      if (length != count) {
        throw SpecFault.of(
            row.place(),
            name
                + " is not square: row "
                + (k + 1)
                + " has "
                + counted(length, "entry", "entries")
                + " and the matrix "
                + counted(count, "row", "rows"),
            "give every row as many entries as there are rows");
      }
    }
    if (order.value().isPresent() && order.value().getAsInt() != count) {
      throw SpecFault.of(
          rows.place(),
          name + " has order " + count + ", but " + order.giver(),
          "all matrices of a family have one order");
    }
    if (count > MAX_ORDER) {
      throw SpecFault.of(
          rows.place(), name + " has order " + count, "orders go up to " + MAX_ORDER);
    }
  }

  private static String counted(int n, String one, String many) {
    return n + " " + (n == 1 ? one : many);
  }
}
