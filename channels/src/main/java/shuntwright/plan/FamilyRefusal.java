package shuntwright.plan;

import shuntwright.circuit.Limit;
import shuntwright.circuit.LimitCheck;

/**
 * Why no part of a family serves a channel.
 *
 * @param family    kind of part
 * @param examined  parts (or combinations) looked at
 * @param refused   how many of them this limit excludes
 * @param nearest   the part that misses by least
 * @param nearMiss  its numbers
 */
public record FamilyRefusal(Limit.Family family, int examined, int refused, String nearest, LimitCheck nearMiss) {}
