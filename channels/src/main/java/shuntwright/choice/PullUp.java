package shuntwright.choice;

import shuntwright.quantity.Toleranced;

/**
 * What pulls a channel's open-drain output up.
 *
 * @param resistance Ω
 * @param voltage    V
 * @param supplied   true where that voltage is the sense supply
 * @param sharedLine true where other channels pull the same line
 */
public record PullUp(double resistance, Toleranced voltage, boolean supplied, boolean sharedLine) {}
