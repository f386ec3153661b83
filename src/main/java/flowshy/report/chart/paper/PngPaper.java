package flowshy.report.chart.paper;

import java.awt.Graphics2D;
import java.awt.RenderingHints;
import java.awt.image.BufferedImage;
import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.UncheckedIOException;
import javax.imageio.IIOImage;
import javax.imageio.ImageIO;
import javax.imageio.ImageTypeSpecifier;
import javax.imageio.ImageWriter;
import javax.imageio.metadata.IIOMetadata;
import javax.imageio.metadata.IIOMetadataNode;
import javax.imageio.stream.MemoryCacheImageOutputStream;
import org.hipparchus.util.FastMath;

/** Takes a picture down as PNG. */
public final class PngPaper {
    private static final double POINTS_AN_INCH = 72.0;
    private static final double METRES_AN_INCH = 0.0254;

    private PngPaper() {}

    /**
     * A picture as PNG.
     *
     * @param picture to be drawn
     * @param dpi pixels an inch, 36 to 1200
     * @return the file's bytes
     * @throws IllegalArgumentException if so many pixels are not sensible
     */
    public static byte[] of(Picture picture, int dpi) {
        if (dpi < 36 || dpi > 1200) {
            throw new IllegalArgumentException(dpi + " dpi: 36 to 1200 are drawn");
        }
        double scale = dpi / POINTS_AN_INCH;
        BufferedImage image = new BufferedImage(
                (int) FastMath.round(scale * picture.width()),
                (int) FastMath.round(scale * picture.height()),
                BufferedImage.TYPE_INT_RGB);
        Graphics2D graphics = image.createGraphics();
        graphics.setRenderingHint(RenderingHints.KEY_ANTIALIASING, RenderingHints.VALUE_ANTIALIAS_ON);
        graphics.setRenderingHint(RenderingHints.KEY_TEXT_ANTIALIASING, RenderingHints.VALUE_TEXT_ANTIALIAS_ON);
        graphics.setRenderingHint(RenderingHints.KEY_FRACTIONALMETRICS, RenderingHints.VALUE_FRACTIONALMETRICS_ON);
        graphics.setRenderingHint(RenderingHints.KEY_STROKE_CONTROL, RenderingHints.VALUE_STROKE_PURE);
        graphics.scale(scale, scale);
        picture.draw(graphics);
        graphics.dispose();
        return file(image, dpi);
    }

    private static byte[] file(BufferedImage image, int dpi) {
        ImageWriter writer = ImageIO.getImageWritersByFormatName("png").next();
        ByteArrayOutputStream bytes = new ByteArrayOutputStream();
        try (MemoryCacheImageOutputStream out = new MemoryCacheImageOutputStream(bytes)) {
            IIOMetadata metadata =
                    writer.getDefaultImageMetadata(ImageTypeSpecifier.createFromRenderedImage(image), null);
            metadata.mergeTree("javax_imageio_png_1.0", density(dpi));
            writer.setOutput(out);
            writer.write(new IIOImage(image, null, metadata));
        } catch (IOException e) { // memory never fails; the signature says it could
            throw new UncheckedIOException(e);
        } finally {
            writer.dispose();
        }
        return bytes.toByteArray();
    }

    private static IIOMetadataNode density(int dpi) {
        String perMetre = Long.toString(FastMath.round(dpi / METRES_AN_INCH));
        IIOMetadataNode size = new IIOMetadataNode("pHYs");
        size.setAttribute("pixelsPerUnitXAxis", perMetre);
        size.setAttribute("pixelsPerUnitYAxis", perMetre);
        size.setAttribute("unitSpecifier", "meter");
        IIOMetadataNode root = new IIOMetadataNode("javax_imageio_png_1.0");
        root.appendChild(size);
        return root;
    }
}
