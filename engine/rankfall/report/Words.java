package rankfall.report;

import java.util.List;
import rankfall.Analysis;
import rankfall.Analysis.Component;
import rankfall.Analysis.Condition;
import rankfall.Analysis.Contracted;
import rankfall.Analysis.ContractionOutcome;
import rankfall.Analysis.Findings;
import rankfall.Analysis.Origin;
import rankfall.Analysis.RealPoints;
import rankfall.Analysis.Signature;
import rankfall.Analysis.Unfollowed;
import rankfall.Analysis.WithoutLimit;
import rankfall.spec.Spec;

/** Sentences that the page and the appendix share. */
final class Words {
  /** What stands in place of the answer where no component was analysed. */
  static final String NO_GENERAL_POINT =
      "Not decided: no general point of the parameter variety was analysed.";

  /** What stands in place of the rank where the span is not closed. */
  static final String NO_ALGEBRA = "no algebra";

  /** What a table of contractions shows. */
  static final String CONTRACTIONS =
      "In these strata the matrices span less than at a general point. The brackets read off at a"
          + " general point can be followed there all the same; where they have a limit, it is the"
          + " contracted algebra. It has the full number of generators and is not the span of the"
          + " matrices. All values hold at the general point of the stratum.";

  private Words() {}

  /** How far the analysis came, a sentence. */
  static String status(Analysis a) {
    return switch (a.status()) {
      case COMPLETE -> "Complete. Every statement below is exact unless it is marked otherwise.";
      case INCOMPLETE ->
          "Incomplete. What is stated is exact, but lists can lack entries: see what is undecided.";
      case FAILED -> "Failed. This family has no results.";
    };
  }

  /** Why a relation holds. */
  static String origin(Origin origin) {
    return switch (origin) {
      case SPEC -> "stated in the spec";
      case CLOSURE -> "needed for the span to close under the bracket";
      case JACOBI -> "needed for the Jacobi identity";
      case FUNCTION -> "identity between functions of a parameter";
      case CONSTANT -> "minimal polynomial of an algebraic number";
    };
  }

  /** Whether there are real points. */
  static String realPoints(RealPoints r) {
    return switch (r) {
      case YES -> "yes";
      case NO -> "none";
      case UNKNOWN -> "not decided";
    };
  }

  /** What became of brackets that were followed into a stratum, in a word or two. */
  static String outcome(ContractionOutcome o) {
    if (o instanceof Contracted) {
      return "limit";
    }
    return o instanceof WithoutLimit ? "no limit" : "not decided";
  }

  /** What stands beside the brackets of an outcome, a sentence. */
  static String outcomeLead(ContractionOutcome o) {
    if (o instanceof Contracted c) {
      return c.structure().isEmpty() ? "All brackets vanish." : "";
    }
    return o instanceof Unfollowed u
        ? "Not decided (" + u.reason() + "); in question are these brackets of the general point:"
        : "No limit: these brackets of the general point have none.";
  }

  /** Over which field, and how listed elements relate to the algebra. */
  static String setting(Spec spec) {
    boolean real = spec.ground() == Spec.Ground.REAL;
    boolean hermitian = spec.convention() == Spec.Convention.HERMITIAN;
    return (real ? "Real span" : "Complex span")
        + (hermitian ? "; the algebra is spanned by \u2212i times the listed elements." : ".");
  }

  /** What all points of a stratum share, a clause. */
  static String stratum(Findings f, String name) {
    return f.strata().stream()
        .filter(s -> s.name().equals(name))
        .findFirst()
        .map(s -> "rank " + s.rank() + " in dimension " + s.dimension() + ", " + s.kind())
        .orElse("");
  }

  /** A signature as {@code (2, 1)}, with the zeros where there are some. */
  static String signature(Signature s) {
    return "("
        + s.plus()
        + ", "
        + s.minus()
        + ")"
        + (s.zero() > 0 ? ", kernel of dimension " + s.zero() : "");
  }

  /** Rank and signature at a general point, a sentence. */
  static String general(Component c) {
    int n = c.basis().size();
    String form =
        n == c.killing().rank()
            ? "is non-degenerate: rank " + n + " in dimension " + n
            : "is degenerate for all parameter values: rank "
                + c.killing().rank()
                + " in dimension "
                + n;
    return "At a general point the Killing form "
        + form
        + c.killing()
            .signature()
            .map(
                s ->
                    ", with "
                        + s.plus()
                        + " positive and "
                        + s.minus()
                        + " negative squares wherever it has this rank at a real point")
            .orElse("")
        + ".";
  }

  /** What the list of conditions of a component says, a sentence. */
  static String conditions(Component c, Analysis.Status status) {
    List<Condition> list = c.conditions();
    boolean complete = status == Analysis.Status.COMPLETE;
    boolean degenerate = c.killing().rank() < c.basis().size();
    if (list.isEmpty()) {
      return complete
          ? degenerate
              ? "On no locus of codimension one does the rank fall further."
              : "It degenerates nowhere: the determinant has no zeros."
          : "No locus of degeneration is listed. The analysis did not finish, so this does not mean"
              + " that there is none.";
    }
    String lead = degenerate ? "The rank falls further" : "It degenerates";
    return lead
        + (complete
            ? list.size() == 1 ? " exactly here:" : " exactly where one of these holds:"
            : " where one of these holds (the list can lack entries):");
  }

  /** Why no determinant is shown, a sentence. */
  static String withoutDeterminant(Component c) {
    return c.killing().rank() < c.basis().size()
        ? "The determinant vanishes for all parameter values."
        : "The determinant was not computed.";
  }

  /** Why no inverse is shown, a sentence. */
  static String withoutInverse(Component c) {
    return c.killing().rank() < c.basis().size()
        ? "There is none: the form is degenerate for all parameter values."
        : "The form is invertible at a general point, but its inverse was not computed.";
  }

  /** A line by which the result is cited. */
  static String citation(Analysis a) {
    return "Family "
        + a.spec().family()
        + ", computed with Rankfall "
        + a.version()
        + " from the spec with SHA-256 "
        + a.spec().source().sha256()
        + ".";
  }
}
