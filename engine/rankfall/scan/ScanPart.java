package rankfall.scan;

/**
 * What came out of a block.
 *
 * @param rows whole rows, perhaps compressed; empty where no table is wanted; not to be modified
 * @param tally of its points
 */
public record ScanPart(byte[] rows, Tally tally) {}
