package rankfall.locus;

import java.time.Duration;
import java.util.ArrayList;
import java.util.List;
import java.util.concurrent.ExecutionException;
import java.util.concurrent.FutureTask;
import java.util.concurrent.TimeUnit;
import java.util.concurrent.TimeoutException;
import rankfall.exact.Chain;
import rankfall.exact.ChainFactoring;
import rankfall.exact.GroebnerBasis;
import rankfall.exact.Polynomial;
import rankfall.locus.Decomposition.Certificate;
import rankfall.locus.Decomposition.Certified;
import rankfall.locus.Decomposition.Component;
import rankfall.locus.Decomposition.NotCertified;

/**
 * Checks a decomposition, however it was found.
 *
 * <ol>
 *   <li>Each component is prime: every storey of its tower is irreducible over those below, no
 *       initial vanishes at the general point, its basis vanishes there and holds its rules.
 *   <li>The input lies in the ideal of every component, and what must not vanish in none.
 *   <li>No component lies in another.
 *   <li>What all components' ideals share, times what must not vanish, lies in the radical of the
 *       input; so there are no zeros outside the components. (The shared ideal and the product of
 *       the ideals have the same radical.)
 * </ol>
 *
 * The last one takes ideal membership; it is given up beyond a size or a time, and the answer says
 * so.
 */
record DecompositionCheck(Chain constants, GroebnerBasis bases, Meter meter) {
  private static final int MOST_COMPONENTS = 40;
  private static final int MOST_GENERATORS = 120;
  private static final Duration LONGEST = Duration.ofSeconds(60);

  /**
   * The certificate.
   *
   * @param equations all vanish on the decomposed set
   * @param nonZero none vanishes anywhere on it
   * @param components what is to be checked
   * @throws IllegalStateException if the components are wrong
   */
  Certificate of(List<Polynomial> equations, List<Polynomial> nonZero, List<Component> components) {
    for (Component c : components) {
      require(isPrime(c.chain()), "is not irreducible", c);
      require(c.equations().stream().allMatch(c.chain()::vanishes), "has a wrong basis", c);
      require(
          bases.outside(c.equations(), together(c.chain(), equations)).isEmpty(),
          "has too small an ideal, or holds points that are no zeros",
          c);
      require(nonZero.stream().noneMatch(c.chain()::vanishes), "is excluded", c);
      for (Component d : components) {
        require(
            d == c || !d.equations().stream().allMatch(c.chain()::vanishes),
            "lies in another one",
            c);
      }
    }
    return covering(equations, nonZero, components);
  }

  private static List<Polynomial> together(Chain chain, List<Polynomial> equations) {
    List<Polynomial> out = new ArrayList<>(equations);
    chain.rules().forEach(r -> out.add(r.equation()));
    return out;
  }

  private static void require(boolean holds, String fault, Component c) {
    if (!holds) {
      throw new IllegalStateException("a component " + fault + ": " + c.equations());
    }
  }

  /**
   * Whether the tower is irreducible storey by storey and the rest of the chain rational over it.
   */
  private static boolean isPrime(Chain chain) {
    List<Chain.Rule> below = new ArrayList<>();
    for (Chain.Rule r : chain.tower()) {
      List<Polynomial> factors =
          ChainFactoring.inVariable(
              new Chain(chain.variables(), below), r.equation(), r.variable());
      if (factors.size() != 1 || factors.get(0).degree(r.variable()) != r.degree()) {
        return false;
      }
      below.add(r);
    }
    List<Chain.Rule> linear = chain.rules().stream().filter(Chain.Rule::isLinear).toList();
    for (Chain.Rule r : linear) {
      for (Chain.Rule s : chain.rules()) {
        if (s != r && s.equation().contains(r.variable())) {
          return false;
        }
      }
    }
    return chain.rules().stream().map(Chain.Rule::initial).noneMatch(chain::vanishes);
  }

  private Certificate covering(
      List<Polynomial> equations, List<Polynomial> nonZero, List<Component> components) {
    if (components.stream().anyMatch(c -> c.equations().isEmpty())) {
      return new Certified();
    }
    int generators = components.stream().mapToInt(c -> c.equations().size()).sum();
    if (components.size() > MOST_COMPONENTS || generators > MOST_GENERATORS) {
      return new NotCertified(
          components.size() + " components with " + generators + " generators are too many");
    }
    FutureTask<Boolean> task = new FutureTask<>(() -> isCovered(equations, nonZero, components));
    Thread thread = new Thread(task, "certificate");
    thread.setDaemon(true);
    thread.start();
    try {
      if (!task.get(LONGEST.toMillis(), TimeUnit.MILLISECONDS)) {
        throw new IllegalStateException("there are zeros on no component: " + equations);
      }
      return new Certified();
    } catch (TimeoutException e) {
      return new NotCertified("the ideals' intersection took too long");
    } catch (InterruptedException e) {
      Thread.currentThread().interrupt();
      return new NotCertified("interrupted");
    } catch (ExecutionException e) {
      throw new IllegalStateException("the check of a decomposition broke off", e.getCause());
    } finally {
      meter.check();
    }
  }

  private boolean isCovered(
      List<Polynomial> equations, List<Polynomial> nonZero, List<Component> components) {
    Polynomial off = nonZero.stream().reduce(constants.one(), Polynomial::times);
    List<Polynomial> shared = List.of(constants.one());
    for (Component c : components) {
      shared =
          shared.equals(List.of(constants.one()))
              ? c.equations()
              : bases.intersection(shared, c.equations());
    }
    List<Polynomial> products = shared.stream().map(off::times).toList();
    return bases.outside(equations, products).stream()
        .allMatch(p -> bases.radicalContains(equations, p));
  }
}
