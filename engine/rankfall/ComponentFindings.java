package rankfall;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import rankfall.Analysis.Combination;
import rankfall.Analysis.Component;
import rankfall.Analysis.Condition;
import rankfall.Analysis.Killing;
import rankfall.Analysis.MatrixEntry;
import rankfall.Analysis.Quotient;
import rankfall.Analysis.StructureEntry;
import rankfall.Forms.Casimir;
import rankfall.exact.Factorization.Factor;
import rankfall.exact.Polynomial;
import rankfall.exact.RationalFunction;
import rankfall.lie.CasimirElement;
import rankfall.lie.DualForm;
import rankfall.lie.Family;
import rankfall.lie.KillingForm;
import rankfall.locus.ComponentForm;
import rankfall.locus.Decomposition;
import rankfall.locus.FamilyAlgebras;
import rankfall.locus.Leaf;
import rankfall.locus.Loci;
import rankfall.locus.Meter;
import rankfall.locus.Partition;
import rankfall.locus.RealPoints;
import rankfall.locus.Strata;
import rankfall.spec.Spec;

/** What is known at the general point of each component of a family. */
record ComponentFindings(
    Spec spec, Family family, Partition partition, List<Component> known, Meter meter) {

  List<Component> all() {
    List<Component> out = new ArrayList<>();
    if (partition.strata().isPresent()) {
      Strata.Result strata = partition.strata().get();
      for (int k : strata.components()) {
        Strata.Stratum s = strata.strata().get(k);
        out.add(component(out.size() + 1, s.leaves().get(0), s.equations()));
      }
    } else if (partition.variety().isPresent()) {
      for (Decomposition.Component c : partition.variety().get().components()) {
        for (Leaf leaf : partition.leaves()) {
          if (leaf instanceof Leaf.Defined d && d.piece().chain().equals(c.chain())) {
            out.add(component(out.size() + 1, d, c.equations()));
          }
        }
      }
    }
    return out;
  }

  private Component component(int number, Leaf.Defined leaf, List<Polynomial> equations) {
    for (Component k : known) {
      if (equations.isEmpty() && k.equations().isEmpty()) {
        List<Factor> zeros =
            k.killing().determinant().map(d -> d.numerator().factors()).orElse(List.of());
        List<Condition> conditions = conditions(leaf, zeros, List.of());
        return withConditions(k, number, conditions);
      }
    }
    ComponentForm c = ComponentForm.of(family, leaf.piece(), equations, seed());
    Optional<KillingForm.FactoredQuotient> determinant = c.form().determinant();
    List<Factor> zeros = determinant.map(KillingForm::zeros).orElse(List.of());
    List<Polynomial> blocks =
        equations.isEmpty() || zeros.isEmpty() ? List.of() : c.blockDeterminants();
    List<Condition> conditions = conditions(leaf, zeros, blocks);
    Killing killing =
        new Killing(
            entries(c.form().matrix()),
            leaf.profile().rank(),
            leaf.algebra().kernel().stream().map(Combination::new).toList(),
            c.form().blocks(),
            determinant.map(d -> new Quotient(d.numerator(), d.denominator())),
            Optional.empty());
    Optional<DualForm> dual =
        determinant.isPresent() && c.basis().size() > 0
            ? DualForm.of(c.chain(), c.form().matrix())
            : Optional.empty();
    return new Component(
        number,
        equations,
        c.chain().dimension(),
        c.basis(),
        structure(c),
        killing,
        dual.map(d -> entries(d.matrix())),
        conditions,
        new TorusFindings(spec, family, c).find(),
        dual.map(d -> casimir(c, d)));
  }

  private static Casimir casimir(ComponentForm c, DualForm dual) {
    return new Casimir(entries(CasimirElement.of(c.chain(), c.constants(), dual).coefficients()));
  }

  private List<Condition> conditions(
      Leaf.Defined leaf, List<Factor> zeros, List<Polynomial> blocks) {
    return new Loci(family.ring().constants(), new FamilyAlgebras(family), meter)
        .in(leaf.piece().chain(), leaf.profile(), partition.leaves(), zeros, blocks).stream()
            .map(this::condition)
            .toList();
  }

  /** A component that is known, its conditions told anew from all leaves. */
  private static Component withConditions(Component c, int number, List<Condition> conditions) {
    Killing k = c.killing();
    return new Component(
        number,
        c.equations(),
        c.parameterDimension(),
        c.basis(),
        c.structure(),
        new Killing(k.entries(), k.rank(), k.kernel(), k.blocks(), k.determinant(), k.signature()),
        c.dual(),
        conditions,
        c.torus(),
        c.casimir());
  }

  /** Depends on the text of the spec alone. */
  private long seed() {
    return Long.parseUnsignedLong(spec.source().sha256().substring(0, 15), 16);
  }

  private Condition condition(Loci.Locus l) {
    return new Condition(
        l.equations(),
        l.multiplicity(),
        l.rank(),
        l.algebra().map(a -> a.constants().dimension() - l.rank().orElseThrow()),
        l.algebra().map(a -> a.basis()).orElse(List.of()),
        l.algebra().map(a -> a.kernel()).orElse(List.of()).stream().map(Combination::new).toList(),
        StratumFindings.verdict(new RealPoints(family).onClosure(l.closure())));
  }

  private static List<StructureEntry> structure(ComponentForm c) {
    List<StructureEntry> out = new ArrayList<>();
    for (int i = 0; i < c.basis().size(); i++) {
      for (int j = i + 1; j < c.basis().size(); j++) {
        for (int k : c.targets(i, j)) {
          RationalFunction f = c.structure(i, j, k);
          if (!f.isZero()) {
            out.add(new StructureEntry(i, j, k, f));
          }
        }
      }
    }
    return out;
  }

  private static List<MatrixEntry> entries(List<List<RationalFunction>> matrix) {
    List<MatrixEntry> out = new ArrayList<>();
    for (int i = 0; i < matrix.size(); i++) {
      for (int j = i; j < matrix.size(); j++) {
        if (!matrix.get(i).get(j).isZero()) {
          out.add(new MatrixEntry(i, j, matrix.get(i).get(j)));
        }
      }
    }
    return out;
  }
}
