package shuntwright.plan;

import shuntwright.quantity.Dimension;

/**
 * A number within a finding.
 *
 * @param name      what it is, for example "required" or "reached"
 * @param value     SI
 * @param dimension its dimension
 */
public record Measure(String name, double value, Dimension dimension) {}
