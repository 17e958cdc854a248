package shuntwright.planner.window;

/** Why no window can be opened on this computer, and what to do. */
@SuppressWarnings("serial")
public final class NoWindow extends Exception {
    NoWindow(String message, Throwable cause) {
        super(message, cause);
    }
}
