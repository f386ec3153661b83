package flowshy.report.chart.paper;

import java.awt.Color;
import java.awt.Graphics;
import java.awt.geom.Rectangle2D;
import java.util.ArrayList;
import java.util.List;
import javax.xml.parsers.DocumentBuilderFactory;
import javax.xml.parsers.ParserConfigurationException;
import org.apache.batik.svggen.SVGGeneratorContext;
import org.apache.batik.svggen.SVGGraphics2D;
import org.apache.batik.svggen.SVGIDGenerator;
import org.w3c.dom.Document;
import org.w3c.dom.Element;

/** Takes a picture down as SVG and notes where its texts lie. */
public final class SvgPaper {
    private static final String SVG = "http://www.w3.org/2000/svg";

    private final Picture picture;
    private final Notebook notebook;

    private SvgPaper(Picture picture, String idPrefix) {
        this.picture = picture;
        this.notebook = new Notebook(context(idPrefix), new ArrayList<>());
        notebook.setSVGCanvasSize(new java.awt.Dimension(picture.width(), picture.height()));
        picture.draw(notebook);
    }

    /**
     * A picture as an SVG document without a prolog.
     *
     * @param picture to be drawn
     * @param idPrefix begins every id
     * @param title of the document
     * @param description of the document
     * @return text
     */
    public static String of(Picture picture, String idPrefix, String title, String description) {
        return new SvgPaper(picture, idPrefix).document(idPrefix, title, description);
    }

    /**
     * Where the texts of a picture lie.
     *
     * @param picture to be drawn
     * @return in the order drawn
     */
    public static List<LaidText> texts(Picture picture) {
        return new SvgPaper(picture, "").notebook.texts;
    }

    private static SVGGeneratorContext context(String idPrefix) {
        try {
            Document document = DocumentBuilderFactory.newInstance()
                    .newDocumentBuilder()
                    .getDOMImplementation()
                    .createDocument(SVG, "svg", null);
            SVGGeneratorContext context = SVGGeneratorContext.createDefault(document);
            context.setComment(null);
            context.setPrecision(2);
            context.setIDGenerator(new SVGIDGenerator() {
                @Override
                public String generateID(String kind) {
                    return idPrefix + super.generateID(kind);
                }
            });
            return context;
        } catch (ParserConfigurationException e) { // the platform's own parser, asked for nothing special
            throw new IllegalStateException(e);
        }
    }

    private String document(String idPrefix, String title, String description) {
        Element root = notebook.getRoot();
        Document document = root.getOwnerDocument();
        root.setAttribute("xmlns", SVG);
        root.setAttribute("viewBox", "0 0 " + picture.width() + " " + picture.height());
        root.setAttribute("role", "img");
        root.setAttribute("aria-labelledby", idPrefix + "title " + idPrefix + "desc");
        root.setAttribute("font-family", Typeface.FAMILIES);
        root.insertBefore(words(document, "desc", idPrefix, description), root.getFirstChild());
        root.insertBefore(words(document, "title", idPrefix, title), root.getFirstChild());
        return new SvgText(idPrefix).of(root);
    }

    private static Element words(Document document, String kind, String idPrefix, String text) {
        Element element = document.createElementNS(SVG, kind);
        element.setAttribute("id", idPrefix + kind);
        element.setTextContent(PlainText.of(text));
        return element;
    }

    /** The library's graphics, which also notes the box of every text. */
    private static final class Notebook extends SVGGraphics2D {
        private final List<LaidText> texts;

        Notebook(SVGGeneratorContext context, List<LaidText> texts) {
            super(context, false);
            this.texts = texts;
            setBackground(Color.WHITE);
        }

        private Notebook(Notebook other) {
            super(other);
            this.texts = other.texts;
        }

        @Override
        public Graphics create() {
            return new Notebook(this);
        }

        @Override
        public void drawString(String text, float x, float y) {
            Rectangle2D box = Pen.box(getFont(), text, x, y);
            boolean whole = getClip() == null || getClip().contains(box);
            texts.add(
                    LaidText.of(text, getTransform().createTransformedShape(box).getBounds2D(), whole));
            super.drawString(text, x, y);
        }
    }
}
