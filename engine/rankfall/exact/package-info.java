/**
 * Exact numbers, polynomials, sets and linear algebra; nothing here rounds without an enclosure.
 *
 * <p>All values are immutable and canonical, so that equality is mathematical equality. This room
 * may use the polynomial library and the fractions of Commons Numbers, and no other room: no
 * document, file, clock or property. What cannot be decided is a value of its own.
 */
package rankfall.exact;
