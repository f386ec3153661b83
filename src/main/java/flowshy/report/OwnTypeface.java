package flowshy.report;

import java.awt.Font;
import java.awt.FontFormatException;
import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;

/**
 * The letters of charts and of the PDF, which travel with the program: a drawing is the same on every machine, also on one that has no
 * typeface at all.
 */
public final class OwnTypeface {
    /** What a browser calls it. */
    public static final String FAMILY = "DejaVu Sans";

    private static final String FOLDER = "/net/sf/jasperreports/fonts/dejavu/";

    private static final String UPRIGHT = "DejaVuSans.ttf";
    private static final String LIST = "sun.awt.fontconfig";

    private OwnTypeface() {}

    /** Loaded when the first letter is measured. */
    private static final class Loaded {
        static final Font PLAIN;
        static final Font BOLD;

        static {
            doWithoutTheMachinesFonts();
            PLAIN = font(UPRIGHT);
            BOLD = font("DejaVuSans-Bold.ttf");
        }
    }

    /**
     * Upright letters.
     *
     * @param size in points
     * @return the font
     */
    public static Font plain(float size) {
        return Loaded.PLAIN.deriveFont(size);
    }

    /**
     * Bold letters.
     *
     * @param size in points
     * @return the font
     */
    public static Font bold(float size) {
        return Loaded.BOLD.deriveFont(Font.BOLD, size); // its file alone does not tell an SVG that it is bold
    }

    /**
     * One file of the typeface.
     *
     * @param file e.g. {@code DejaVuSans-Oblique.ttf}
     * @return its bytes, to be closed
     */
    public static InputStream open(String file) {
        return OwnTypeface.class.getResourceAsStream(FOLDER + file);
    }

    /**
     * Java on Linux asks fontconfig which fonts stand for its logical ones and stops with an error where there are none. It does not ask
     * when it is given a list, empty here, and looks for a font of last resort nowhere but in the folder that it is shown, which holds ours.
     */
    private static void doWithoutTheMachinesFonts() {
        if (!System.getProperty("os.name", "").startsWith("Linux") || System.getProperty(LIST) != null) {
            return;
        }
        try (InputStream letters = open(UPRIGHT)) {
            Path folder = Files.createTempDirectory("flowshy");
            Path list = folder.resolve("list.properties");
            for (Path gone : List.of(folder, list, folder.resolve(UPRIGHT))) { // what is named last goes first
                gone.toFile().deleteOnExit();
            }
            Files.writeString(list, "version=1\nsequence.allfonts=default\n");
            Files.copy(letters, folder.resolve(UPRIGHT));
            System.setProperty(LIST, list.toString());
            System.setProperty("sun.java2d.fontpath", folder.toString());
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    private static Font font(String file) {
        try (InputStream letters = open(file)) {
            return Font.createFont(Font.TRUETYPE_FONT, letters);
        } catch (IOException | FontFormatException e) { // it lies in the program itself
            throw new IllegalStateException(e);
        }
    }
}
