/**
 * Many exact points of one family: grids, samples and lists, each point answered by the signs of
 * the polynomials that an analysis has prepared.
 *
 * <p>{@code Lattice} and {@code PointList} hold points in a fixed order; {@code SignProgram} tells
 * signs; {@code Atlas} tells from signs where a point lies; {@code ScanRun} goes through the points
 * block by block and {@code Checkpoint} remembers how far it came. May use: {@code exact}, {@code
 * locus} and the records of the root package, whose analysis is the input.
 */
package rankfall.scan;
