package shuntwright.planner.window;

import java.net.URL;
import java.util.List;

import javafx.application.ColorScheme;
import javafx.scene.Scene;
import javafx.scene.control.DialogPane;
import javafx.scene.text.Font;

/** The style sheets: colours light or dark, then everything else. */
enum Theme {
    LIGHT("light.css"), DARK("dark.css");

    private static final List<String> FONTS = List.of("fonts/DejaVuSansCondensed.ttf",
            "fonts/DejaVuSansCondensed-Bold.ttf");

    private final String colours;

    Theme(String colours) {
        this.colours = colours;
    }

    /** Makes the fonts known; needed before the first control. */
    static void loadFonts() {
        FONTS.forEach(name -> Font.loadFont(resource(name).toExternalForm(), 12));
    }

    static Theme of(ColorScheme scheme) {
        return switch (scheme) {
            case LIGHT -> LIGHT;
            case DARK -> DARK;
        };
    }

    void apply(Scene scene) {
        scene.getStylesheets().setAll(sheets());
    }

    void apply(DialogPane pane) {
        pane.getStylesheets().setAll(sheets());
    }

    private List<String> sheets() {
        return List.of(resource(colours).toExternalForm(), resource("window.css").toExternalForm());
    }

    private static URL resource(String name) {
        URL found = Theme.class.getResource(name);
        if (found == null) {
            throw new IllegalStateException("the program's resource " + name + " is missing; build it again");
        }
        return found;
    }
}
