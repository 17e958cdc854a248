package shuntwright.planner.window.chart;

import java.awt.image.BufferedImage;

import javafx.embed.swing.SwingFXUtils;
import javafx.scene.Node;
import javafx.scene.SnapshotParameters;
import javafx.scene.transform.Transform;

/** Pictures of drawings for files. */
public final class Pictures {
    private static final double SCALE = 2;

    private Pictures() {
    }

    /** The drawing, twice as fine as on the screen. */
    public static BufferedImage of(Node drawing) {
        SnapshotParameters parameters = new SnapshotParameters();
        parameters.setTransform(Transform.scale(SCALE, SCALE));
        return SwingFXUtils.fromFXImage(drawing.snapshot(parameters, null), null);
    }
}
