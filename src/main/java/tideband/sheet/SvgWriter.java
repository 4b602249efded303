package tideband.sheet;

import java.io.IOException;
import java.io.StringWriter;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.stream.Collectors;
import org.apache.batik.anim.dom.SVGDOMImplementation;
import org.apache.batik.dom.util.DOMUtilities;
import org.w3c.dom.Document;
import org.w3c.dom.Element;

/** Writes a drawing as SVG 1.1: millimetres throughout, text as text, and nothing but shapes. */
final class SvgWriter implements Mark.Writer {
    private static final String NS = SVGDOMImplementation.SVG_NAMESPACE_URI;
    private static final int DECIMALS = 4;

    private final Document document;
    private final Element root;

    private SvgWriter(Drawing drawing) {
        document = SVGDOMImplementation.getDOMImplementation().createDocument(NS, "svg", null);
        root = document.getDocumentElement();
        String width = number(drawing.widthMm());
        String height = number(drawing.heightMm());
        root.setAttributeNS(null, "width", width + "mm");
        root.setAttributeNS(null, "height", height + "mm");
        root.setAttributeNS(null, "viewBox", "0 0 " + width + " " + height);
        root.setAttributeNS(null, "role", "img");
        // Arial and Helvetica have the same widths as the typeface the text was measured with.
        root.setAttributeNS(null, "font-family", "'Liberation Sans', Arial, Helvetica, sans-serif");
        textElement("title", drawing.title());
        textElement("desc", drawing.description());
    }

    static byte[] bytes(Drawing drawing) {
        SvgWriter writer = new SvgWriter(drawing);
        drawing.marks().forEach(mark -> mark.to(writer));
        StringWriter text = new StringWriter();
        try {
            DOMUtilities.writeDocument(writer.document, text);
        } catch (IOException e) {
            throw new UncheckedIOException("writing to memory failed", e);
        }
        return text.toString().getBytes(StandardCharsets.UTF_8);
    }

    @Override
    public void box(Mark.Box box) {
        Element e = inked("rect", box.ink());
        put(e, "x", box.xMm());
        put(e, "y", box.yMm());
        put(e, "width", box.widthMm());
        put(e, "height", box.heightMm());
    }

    @Override
    public void shape(Mark.Shape shape) {
        Element e = inked("polygon", shape.ink());
        e.setAttributeNS(
                null,
                "points",
                shape.corners().stream()
                        .map(p -> number(p.xMm()) + "," + number(p.yMm()))
                        .collect(Collectors.joining(" ")));
    }

    @Override
    public void line(Mark.Line line) {
        Element e = element("line");
        put(e, "x1", line.from().xMm());
        put(e, "y1", line.from().yMm());
        put(e, "x2", line.to().xMm());
        put(e, "y2", line.to().yMm());
        e.setAttributeNS(null, "stroke", line.hex());
        put(e, "stroke-width", line.widthMm());
        if (line.dashMm() > 0) {
            put(e, "stroke-dasharray", line.dashMm());
        }
    }

    @Override
    public void words(Mark.Words words) {
        Element e = textElement("text", words.text());
        put(e, "x", words.at().xMm());
        put(e, "y", words.at().yMm());
        put(e, "font-size", words.sizeMm());
        if (words.bold()) {
            e.setAttributeNS(null, "font-weight", "bold");
        }
        e.setAttributeNS(
                null,
                "text-anchor",
                switch (words.anchor()) {
                    case START -> "start";
                    case MIDDLE -> "middle";
                    case END -> "end";
                });
        e.setAttributeNS(null, "fill", words.hex());
        // Holds the line to its measured width, whatever font the viewer has.
        put(e, "textLength", words.widthMm());
        e.setAttributeNS(null, "lengthAdjust", "spacingAndGlyphs");
    }

    private Element inked(String name, Ink ink) {
        Element e = element(name);
        e.setAttributeNS(null, "fill", ink.fillHex().isEmpty() ? "none" : ink.fillHex());
        if (!ink.lineHex().isEmpty()) {
            e.setAttributeNS(null, "stroke", ink.lineHex());
            put(e, "stroke-width", ink.lineMm());
        }
        return e;
    }

    private Element textElement(String name, String text) {
        Element e = element(name);
        e.appendChild(document.createTextNode(basic(text)));
        return e;
    }

    /** Batik's serializer takes only the basic multilingual plane; what lies beyond it shows as missing. */
    private static String basic(String text) {
        StringBuilder out = new StringBuilder();
        text.codePoints()
                .map(c -> Character.isBmpCodePoint(c) ? c : Typeface.REPLACEMENT)
                .forEach(out::appendCodePoint);
        return out.toString();
    }

    private Element element(String name) {
        Element e = document.createElementNS(NS, name);
        root.appendChild(e);
        return e;
    }

    private static void put(Element e, String name, double value) {
        e.setAttributeNS(null, name, number(value));
    }

    private static String number(double value) {
        return Figures.plain(value, DECIMALS);
    }
}
