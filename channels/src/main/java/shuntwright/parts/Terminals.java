package shuntwright.parts;

/** How a shunt is connected for sensing. */
public enum Terminals {
    /** Sense and load current share the joints: the mounting resistance is part of what is measured. */
    TWO,
    /** Own sense terminals: the mounting resistance drops out. */
    FOUR
}
