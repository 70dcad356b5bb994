/**
 * Lie algebras given by structure constants: what they are, their Killing form and their invariant
 * forms.
 *
 * <p>Vectors are sparse: the non-zero coordinates by position from 0. Linear algebra is free of
 * fractions, so vectors and rows stand for their multiples; only the Killing matrix and what is
 * made of it are exact values. The theorems used hold in characteristic 0. May use {@code
 * rankfall.spec}, {@code rankfall.exact} and, in one class, Symja.
 */
package rankfall.lie;
