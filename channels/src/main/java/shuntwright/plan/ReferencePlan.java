package shuntwright.plan;

import shuntwright.parts.Reference;

/**
 * A reference of the board with its part.
 *
 * @param name what channels, taps and the ADC call it
 * @param part with its limits
 * @param load current of all dividers from it, A
 */
public record ReferencePlan(String name, Reference part, double load) {}
