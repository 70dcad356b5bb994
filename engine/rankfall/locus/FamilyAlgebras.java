package rankfall.locus;

import java.util.ArrayList;
import java.util.List;
import rankfall.exact.Chain;
import rankfall.exact.Polynomial;
import rankfall.lie.Family;
import rankfall.lie.FamilySite;
import rankfall.lie.PlainKilling;
import rankfall.lie.Span;
import rankfall.lie.SpanInput;
import rankfall.lie.StructureConstants;

/**
 * A family, asked at the general point of a piece by evaluating its generators there.
 *
 * @param family the family
 */
public record FamilyAlgebras(Family family) implements Algebras {

  @Override
  public Outcome on(Piece piece) {
    Span<Polynomial> span = span(piece);
    if (span instanceof Span.Open<Polynomial> open) {
      return new NotClosed(open.names().size(), open.conditions(), open.nonVanishing());
    }
    Span.Closed<Polynomial> closed = (Span.Closed<Polynomial>) span;
    Chain chain = piece.chain();
    StructureConstants<Polynomial> constants = BranchAlgebra.reduced(chain, closed.constants());
    List<List<Polynomial>> traces = PlainKilling.of(constants);
    return new Closed(
        new BranchAlgebra(constants, closed.names(), BranchAlgebra.reducedMatrix(chain, traces)),
        closed.nonVanishing());
  }

  /** The span at the general point; what is known not to vanish is welcome as a pivot. */
  private Span<Polynomial> span(Piece piece) {
    FamilySite site = family.on(piece.chain());
    if (!(site instanceof FamilySite.Algebraic at)) {
      throw new IllegalStateException("a piece inside the poles: " + piece.chain().rules());
    }
    return Span.of(known(piece, at.input()));
  }

  private static SpanInput<Polynomial> known(Piece piece, SpanInput<Polynomial> input) {
    KnownNonZero domain = KnownNonZero.on(piece);
    if (input instanceof SpanInput.Matrices<Polynomial> m) {
      return new SpanInput.Matrices<>(domain, m.order(), m.generate(), m.matrices());
    }
    SpanInput.Table<Polynomial> t = (SpanInput.Table<Polynomial>) input;
    StructureConstants<Polynomial> c = t.table();
    return new SpanInput.Table<>(
        t.names(),
        new StructureConstants<>(domain, c.dimension(), c.brackets(), c.denominator(), c.scale()));
  }

  /**
   * The polynomials that must not vanish at a point of the family: poles, and what `!=` excludes.
   */
  public List<Polynomial> excluded() {
    List<Polynomial> out = new ArrayList<>(family.poles());
    family.domain().stream()
        .filter(c -> !c.allows(0))
        .map(c -> c.polynomial())
        .filter(p -> !p.isConstant())
        .forEach(out::add);
    return out;
  }
}
