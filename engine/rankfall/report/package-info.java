/**
 * Files out of an {@link rankfall.Analysis}: tables, one machine-readable file, a fragment for a
 * paper and a page for the eye.
 *
 * <p>Nothing here computes mathematics: every number and every formula stands in the analysis. A
 * formula is turned into a tree of what is set on paper once ({@code Formulas}), and two renderers
 * write that tree as MathML Core and as LaTeX. May use: the records of the root package, {@code
 * exact} and {@code spec} for reading; Commons CSV, Jackson and pebble, which no other room uses.
 */
package rankfall.report;
