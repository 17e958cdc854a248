package shuntwright.io.picture;

import java.awt.image.BufferedImage;
import java.io.IOException;
import java.io.OutputStream;

import javax.imageio.ImageIO;

/** Writes Portable Network Graphics (ISO/IEC 15948). */
public final class PngFile {
    private PngFile() {
    }

    /** @throws IOException when the stream cannot be written */
    public static void write(BufferedImage picture, OutputStream out) throws IOException {
        if (!ImageIO.write(picture, "png", out)) {
            throw new IOException("this Java has no writer for PNG; install one with the module java.desktop complete");
        }
    }
}
