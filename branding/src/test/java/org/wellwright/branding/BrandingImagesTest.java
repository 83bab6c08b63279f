package org.wellwright.branding;

import static org.assertj.core.api.Assertions.assertThat;

import java.awt.Color;
import java.awt.image.BufferedImage;
import java.io.IOException;
import java.nio.file.Path;
import java.util.Map;
import javax.imageio.ImageIO;
import org.junit.jupiter.api.Test;

class BrandingImagesTest {
    private static final Path BRANDING = Path.of("src/main/nbm-branding");

    @Test
    void theIconFilesShowTheMarkAsItIsDrawnNow() throws IOException {
        for (Map.Entry<String, BufferedImage> icon : BrandingImages.icons().entrySet()) {
            BufferedImage file = ImageIO.read(BRANDING.resolve(icon.getKey()).toFile());
            assertThat(meanDifference(file, icon.getValue())).as(icon.getKey()).isLessThan(1.0);
        }
    }

    @Test
    void theSplashPicturesHaveTheSizeThePlatformIsTold() throws IOException {
        for (Map.Entry<String, BufferedImage> picture : BrandingImages.all().entrySet()) {
            BufferedImage file = ImageIO.read(BRANDING.resolve(picture.getKey()).toFile());
            assertThat(file.getWidth())
                    .as(picture.getKey())
                    .isEqualTo(picture.getValue().getWidth());
            assertThat(file.getHeight())
                    .as(picture.getKey())
                    .isEqualTo(picture.getValue().getHeight());
        }
    }

    /** In steps of 1/255, over all pixels and channels. */
    private static double meanDifference(BufferedImage one, BufferedImage other) {
        assertThat(one.getWidth()).isEqualTo(other.getWidth());
        assertThat(one.getHeight()).isEqualTo(other.getHeight());
        double sum = 0;
        for (int y = 0; y < one.getHeight(); y++) {
            for (int x = 0; x < one.getWidth(); x++) {
                Color a = new Color(one.getRGB(x, y), true);
                Color b = new Color(other.getRGB(x, y), true);
                sum += Math.abs(a.getRed() - b.getRed())
                        + Math.abs(a.getGreen() - b.getGreen())
                        + Math.abs(a.getBlue() - b.getBlue())
                        + Math.abs(a.getAlpha() - b.getAlpha());
            }
        }
        return sum / (4.0 * one.getWidth() * one.getHeight());
    }
}
