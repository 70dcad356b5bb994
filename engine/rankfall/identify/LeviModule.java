package rankfall.identify;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import rankfall.exact.Polynomial;
import rankfall.lie.PlainKilling;
import rankfall.lie.StructureConstants;

/**
 * A semisimple algebra that acts on an abelian ideal.
 *
 * <p>Ideals that are conjugate over the field of the constants are told apart over a larger field
 * of numbers of the same kind, which changes neither the algebra over the real or complex numbers
 * nor its module.
 *
 * @param ground the field
 * @param constants of a multiple of the basis
 * @param scale that multiple
 * @param action of the basis
 */
record LeviModule<E>(Ground<E> ground, StructureConstants<E> constants, E scale, Action<E> action) {

  /** Algebra and module by summands, where all of them have names. */
  Optional<List<ModuleName>> names() {
    List<SimpleIdeals.Part<E>> parts = SimpleIdeals.parts(ground, constants);
    Optional<List<E>> splitting = parts.stream().flatMap(p -> p.splitting().stream()).findFirst();
    if (splitting.isPresent()) {
      return over(RootExtension.of(ground, splitting.get())).names();
    }
    Optional<ModuleParts> module =
        ModuleParts.of(ground, PlainKilling.of(constants), scale, parts, action);
    if (module.isEmpty()) {
      return Optional.empty();
    }
    List<ModuleName> out = new ArrayList<>();
    for (ModuleParts.Summand s : module.get().summands()) {
      ModuleName.of(s.ideals().stream().map(parts::get).toList(), s.module()).ifPresent(out::add);
    }
    return out.size() == module.get().summands().size() ? Optional.of(out) : Optional.empty();
  }

  private LeviModule<Polynomial> over(RootExtension<E> larger) {
    return new LeviModule<>(
        larger.ground(),
        larger.image(constants),
        larger.image(scale),
        new Action<>(
            action.dimension(),
            larger.image(action.factor()),
            action.matrices().stream()
                .map(columns -> columns.stream().map(larger::image).toList())
                .toList()));
  }
}
