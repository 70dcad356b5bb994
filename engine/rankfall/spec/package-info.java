/**
 * From the bytes of a spec file to the record {@link rankfall.spec.Spec}, or to the faults in it.
 *
 * <p>{@link rankfall.spec.SpecReader} is the front door: bytes in, one {@link
 * rankfall.spec.SpecResult} a YAML document out. {@link rankfall.spec.ExpressionReader} reads one
 * expression, {@link rankfall.spec.DiagnosticText} lays a fault out for a person, {@link
 * rankfall.spec.SpecSchema} holds the JSON Schema of the format.
 *
 * <p>What may be assumed of a {@code Spec}: every name in it is known and used once; matrices are
 * square and of one order; matrix units lie inside it; right-hand sides of brackets and
 * combinations of matrices are linear in generators; every number is exact; lists and maps cannot
 * be changed. What may not: that conditions can be met, that denominators differ from 0 (other than
 * literal ones), that minimal polynomials are irreducible, that a pair of generators given twice
 * has equal brackets, that Jacobi's identity holds. Those questions need arithmetic and belong to
 * later rooms.
 *
 * <p>Nothing here evaluates, prints, or opens a file. Imports: java.base, snakeyaml-engine and
 * commons-numbers-fraction; no other room.
 */
package rankfall.spec;
