package shuntwright.io.picture;

import static org.assertj.core.api.Assertions.assertThat;

import java.awt.image.BufferedImage;
import java.io.ByteArrayInputStream;
import java.io.ByteArrayOutputStream;
import java.io.IOException;

import javax.imageio.ImageIO;

import org.junit.jupiter.api.Test;

class PngFileTest {
    @Test
    void whatIsWrittenReadsBackAsTheSamePicture() throws IOException {
        BufferedImage picture = new BufferedImage(3, 2, BufferedImage.TYPE_INT_ARGB);
        picture.setRGB(1, 1, 0xff336699);
        ByteArrayOutputStream out = new ByteArrayOutputStream();
        PngFile.write(picture, out);
        BufferedImage back = ImageIO.read(new ByteArrayInputStream(out.toByteArray()));
        assertThat(back.getWidth()).isEqualTo(3);
        assertThat(back.getHeight()).isEqualTo(2);
        assertThat(back.getRGB(1, 1)).isEqualTo(0xff336699);
        assertThat(back.getRGB(0, 0)).isZero();
    }
}
