package flowshy.report.chart.paper;

import java.util.Set;
import org.w3c.dom.Attr;
import org.w3c.dom.Element;
import org.w3c.dom.NamedNodeMap;
import org.w3c.dom.Node;

/** Writes a tree of elements as text: attributes in the order of their names, everything that XML reserves escaped. */
final class SvgText {
    /** Properties that the generator repeats at their initial value. */
    private static final Set<String> IDLE = Set.of(
            "color-interpolation",
            "color-rendering",
            "image-rendering",
            "shape-rendering",
            "text-rendering",
            "xml:space");

    private final String idPrefix;
    private final StringBuilder text = new StringBuilder();

    SvgText(String idPrefix) {
        this.idPrefix = idPrefix;
    }

    String of(Element root) {
        element(root);
        return text.append('\n').toString();
    }

    private void element(Element element) {
        if (element.getTagName().equals("defs") && !element.hasChildNodes()) {
            return;
        }
        text.append('<').append(element.getTagName());
        NamedNodeMap attributes = element.getAttributes();
        for (int i = 0; i < attributes.getLength(); i++) {
            attribute((Attr) attributes.item(i));
        }
        if (!element.hasChildNodes()) {
            text.append("/>");
            return;
        }
        text.append('>');
        for (Node child = element.getFirstChild(); child != null; child = child.getNextSibling()) {
            if (child instanceof Element inner) {
                element(inner);
            } else if (child.getNodeType() == Node.TEXT_NODE) {
                escape(child.getNodeValue());
            }
        }
        text.append("</").append(element.getTagName()).append(">\n");
    }

    private void attribute(Attr attribute) {
        String name = attribute.getName();
        String value = attribute.getValue();
        // letters are chosen once, at the root
        boolean letters =
                name.equals("font-family") && attribute.getOwnerElement().getParentNode() instanceof Element;
        if (IDLE.contains(name) || name.startsWith("xmlns:") || letters) {
            return;
        }
        // the one id that the generator does not ask for
        boolean fixed = name.equals("id") && value.equals("genericDefs");
        text.append(' ').append(name).append("=\"");
        escape(fixed ? idPrefix + value : value);
        text.append('"');
    }

    private void escape(String plain) {
        for (int i = 0; i < plain.length(); i++) {
            char c = plain.charAt(i);
            switch (c) {
                case '<' -> text.append("&lt;");
                case '>' -> text.append("&gt;");
                case '&' -> text.append("&amp;");
                case '"' -> text.append("&quot;");
                default -> text.append(c);
            }
        }
    }
}
