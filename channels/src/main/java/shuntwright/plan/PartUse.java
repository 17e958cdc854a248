package shuntwright.plan;

import java.util.List;

import shuntwright.parts.Purchase;

/**
 * A line of the consolidated parts list.
 *
 * @param partNumber  what to order
 * @param description with its value
 * @param quantity    pieces on one board
 * @param designators of those pieces, letters by IEEE 315: R1, U1 …; as many as {@code quantity}
 * @param users       channels or shared circuits they serve, one for each designator
 * @param purchase    how it is sold
 */
public record PartUse(String partNumber, String description, int quantity, List<String> designators,
        List<String> users, Purchase purchase) {
    public PartUse {
        designators = List.copyOf(designators);
        users = List.copyOf(users);
    }
}
