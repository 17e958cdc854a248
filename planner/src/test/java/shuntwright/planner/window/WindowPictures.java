package shuntwright.planner.window;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.file.Path;

import javax.imageio.ImageIO;

import javafx.embed.swing.SwingFXUtils;
import javafx.scene.Scene;

/** Takes pictures of the window. */
final class WindowPictures {
    private WindowPictures() {
    }

    static void write(Scene scene, Path file) {
        try {
            ImageIO.write(SwingFXUtils.fromFXImage(scene.snapshot(null), null), "png", file.toFile());
        } catch (IOException problem) {
            throw new UncheckedIOException(problem);
        }
    }
}
