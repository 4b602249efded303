package tideband.sheet;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.io.ByteArrayInputStream;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.List;
import java.util.Set;
import javax.xml.parsers.DocumentBuilderFactory;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import org.w3c.dom.Document;
import org.w3c.dom.Element;
import org.w3c.dom.NodeList;
import tideband.bench.BenchPlan;

class PreviewSvgTest {
    static List<BenchPlan> plans() {
        return BenchPlans.all();
    }

    /** Property, computed from the marks. */
    @ParameterizedTest
    @MethodSource("plans")
    void noTextLiesOnAnotherOrOutside(BenchPlan plan) {
        Drawing drawing = PreviewSvg.drawing(plan, BenchPlans.COLOURS);
        assertThat(Layout.outside(drawing)).isEmpty();
        assertThat(Layout.overlaps(drawing)).isEmpty();
    }

    /** Property: the file holds what the picture is for, as text. */
    @Test
    void bandsFilmsVoltsAndColoursAreWords() throws Exception {
        String text = parse(PreviewSvg.bytes(BenchPlans.lanternHook(), BenchPlans.COLOURS))
                .getDocumentElement()
                .getTextContent();
        assertThat(text)
                .contains("Lantern hook", "2 dusk", "150.0 \u2192 46.0 nm", "83.3 \u2192 25.6 V")
                .contains(
                        "violet (2) \u2192 deep blue (1)", "proven", "16.5 min", "scale 1:1", "soft edge", "D65 light");
    }

    /** Property: lengths are millimetres and numbers plain. */
    @Test
    void unitsAreMillimetres() throws Exception {
        Element root = parse(PreviewSvg.bytes(BenchPlans.lanternHook(), BenchPlans.COLOURS))
                .getDocumentElement();
        assertThat(root.getAttribute("width")).isEqualTo("297mm");
        assertThat(root.getAttribute("viewBox")).startsWith("0 0 297 ");
        assertThat(new String(PreviewSvg.bytes(BenchPlans.sixtyBands(), BenchPlans.COLOURS), StandardCharsets.UTF_8))
                .doesNotContainPattern("\"-?[0-9.]+[eE][-+]?[0-9]+\"");
    }

    /** Property: names open no tag, whatever they hold; only shapes and text come out. */
    @Test
    void namesInjectNothing() throws Exception {
        BenchPlan plan = BenchPlans.lanternHook(
                "</text></title><script>alert(1)</script><foreignObject/>]]>&lt;\" onload=\"x\u0000\ud83d\udd25\ud800"
                        + "\u05d0\u05d1\u202e",
                "<image href='http://example.org/'/>");
        byte[] svg = PreviewSvg.bytes(plan, BenchPlans.COLOURS);
        NodeList all = parse(svg).getElementsByTagName("*");
        List<String> names = new ArrayList<>();
        for (int i = 0; i < all.getLength(); i++) {
            names.add(all.item(i).getNodeName());
            assertThat(((Element) all.item(i)).hasAttribute("onload")).isFalse();
            assertThat(((Element) all.item(i)).hasAttribute("href")).isFalse();
        }
        assertThat(Set.copyOf(names)).isSubsetOf("svg", "title", "desc", "rect", "polygon", "line", "text");
    }

    /** Property: the piece is to scale; 68 mm of fade take 68 mm at 1:1. */
    @Test
    void pieceIsToScale() {
        Drawing drawing = PreviewSvg.drawing(BenchPlans.lanternHook(), BenchPlans.COLOURS);
        List<Mark.Line> edges = drawing.marks().stream()
                .filter(m -> m instanceof Mark.Line line && line.dashMm() == 0.55)
                .map(m -> (Mark.Line) m)
                .toList();
        assertThat(edges.get(1).from().xMm() - edges.get(0).from().xMm()).isCloseTo(68, within(1e-9));
    }

    private static Document parse(byte[] svg) throws Exception {
        DocumentBuilderFactory factory = DocumentBuilderFactory.newInstance();
        factory.setNamespaceAware(true);
        return factory.newDocumentBuilder().parse(new ByteArrayInputStream(svg));
    }
}
