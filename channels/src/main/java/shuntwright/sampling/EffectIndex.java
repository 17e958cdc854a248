package shuntwright.sampling;

import shuntwright.accuracy.Input;

/**
 * How much of an outcome's variance an input explains (Sobol indices, estimated as Jansen 1999 and Saltelli et al. 2010 do). Pieces
 * of one reel move together and have one index.
 *
 * @param input      which
 * @param first      by itself, 0 to 1
 * @param firstError its standard error
 * @param total      with everything it multiplies, 0 to 1; above {@code first} where it acts through others, as a drift does
 * @param totalError its standard error
 */
public record EffectIndex(Input input, double first, double firstError, double total, double totalError) {}
