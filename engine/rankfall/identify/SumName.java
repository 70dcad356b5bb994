package rankfall.identify;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import java.util.stream.Collectors;
import rankfall.identify.SimpleIdeal.Kind;

/** The names of sums of simple ideals. */
final class SumName {
  private static final Comparator<SimpleIdeal> ORDER =
      Comparator.comparingInt(SimpleIdeal::dimension)
          .thenComparing(SimpleIdeal::kind)
          .thenComparingInt(i -> i.character().orElse(0))
          .thenComparing(i -> one(i).name());

  private SumName() {}

  /** The ideals by dimension, compact ones first among equal ones. */
  static List<SimpleIdeal> sorted(List<SimpleIdeal> ideals) {
    return ideals.stream().sorted(ORDER).toList();
  }

  /** The real form of a real ideal, if type and character decide. */
  static Optional<RealForm> form(SimpleIdeal ideal) {
    if (ideal.type().isEmpty() || ideal.kind() == Kind.COMPLEX) {
      return Optional.empty();
    }
    if (ideal.kind() == Kind.COMPLEX_AS_REAL) {
      return Optional.of(RealForms.complexAsReal(ideal.type().get()));
    }
    List<RealForm> forms = RealForms.of(ideal.type().get(), ideal.character().getAsInt());
    return forms.size() == 1 ? Optional.of(forms.get(0)) : Optional.empty();
  }

  /** The name of one ideal. */
  static TypeName one(SimpleIdeal ideal) {
    if (ideal.type().isEmpty()) {
      return TypeName.of("simple algebra of dimension " + ideal.dimension());
    }
    if (ideal.kind() == Kind.COMPLEX) {
      return RealForms.complexName(ideal.type().get());
    }
    Optional<RealForm> form = form(ideal);
    if (form.isPresent()) {
      return new TypeName(form.get().name(), form.get().otherNames());
    }
    List<RealForm> forms = RealForms.of(ideal.type().get(), ideal.character().getAsInt());
    if (forms.isEmpty()) {
      throw new IllegalStateException(
          "no real form of " + ideal.type().get() + " has character " + ideal.character());
    }
    return TypeName.of(forms.stream().map(RealForm::name).collect(Collectors.joining(" or ")));
  }

  /**
   * The name of a semisimple algebra.
   *
   * @param ideals its simple ideals, at least one
   */
  static TypeName of(List<SimpleIdeal> ideals) {
    List<SimpleIdeal> sorted = sorted(ideals);
    if (sorted.size() == 1) {
      return one(sorted.get(0));
    }
    List<String> names = sorted.stream().map(i -> one(i).name()).toList();
    String plain = String.join(" + ", names);
    List<String> others = new ArrayList<>(List.of(plain));
    String merged = String.join(" + ", merged(names));
    others.add(merged);
    if (plain.equals("so(3) + sl(2,R)")) {
      others.add("so*(4)");
    }
    if (plain.equals("so(3,1) + so(3,1)")) {
      others.add("so(4,C)_R");
    }
    others.add(plain.replace("so(3)", "su(2)"));
    others.add(merged.replace("sl(2,R)", "so(2,1)"));
    others.add(plain.replace("sl(2,R)", "so(2,1)"));
    others.add(plain.replace("so(3,1)", "sl(2,C)_R"));
    return new TypeName(names.size() == 2 ? merged : plain, others);
  }

  /** Pairs of equal ideals of dimension 3 by their orthogonal names, after single ones. */
  private static List<String> merged(List<String> names) {
    List<String> out = new ArrayList<>();
    int single = 0;
    for (int k = 0; k < names.size(); k++) {
      boolean pair = k + 1 < names.size() && names.get(k).equals(names.get(k + 1));
      String both =
          switch (names.get(k)) {
            case "so(3)" -> "so(4)";
            case "sl(2,R)" -> "so(2,2)";
            case "sl(2,C)" -> "so(4,C)";
            default -> "";
          };
      if (pair && !both.isEmpty()) {
        out.add(both);
        k++;
      } else if (List.of("so(3)", "sl(2,R)", "sl(2,C)").contains(names.get(k))) {
        out.add(single++, names.get(k));
      } else {
        out.add(names.get(k));
      }
    }
    return out;
  }
}
