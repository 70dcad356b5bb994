/**
 * What a Lie algebra is: simple ideals, root systems, real forms, and the usual names. Input are
 * structure constants over an exact field; a name is given only where it is proved, and a
 * description stands where no name is. May use: exact, lie, locus.
 */
package rankfall.identify;
