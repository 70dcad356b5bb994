/** A house that breaks every law, so that a law that cannot be broken is noticed. */
package rankfall.house.broken;
