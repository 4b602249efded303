package tideband.design;

import static org.assertj.core.api.Assertions.assertThat;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.node.ArrayNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.Random;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;

/** Property: whatever the file, reading it ends in a design or in faults, never in an exception. */
class DesignFuzzTest {

    private static final List<String> FILES = List.of(Samples.HOOK, Samples.SHUTTER, Samples.PIPE, Samples.BATH);

    private static final List<String> VALUES = List.of(
            "null",
            "true",
            "false",
            "0",
            "-0.0",
            "1",
            "-1",
            "0.5",
            "2.5",
            "1e9",
            "1e-300",
            "1e400",
            "4999.999",
            "160",
            "\"\"",
            "\"A\"",
            "\"soft\"",
            "\"round\"",
            "\"tube\"",
            "\"#ffffff\"",
            "\"phosphate\"",
            "\"x\\u0000y\"",
            "[]",
            "[1,2]",
            "[[[]]]",
            "{}",
            "{\"lab\":[1,2,3]}",
            "{\"at_mm\":1,\"size_mm\":1}",
            "[{\"to_mm\":160,\"bare\":true}]");

    private static void check(byte[] bytes) {
        for (Reading<?> reading : List.of(DesignFile.read(bytes, Optional.empty()), BathFile.read(bytes))) {
            if (reading instanceof Reading.Faulty<?> faulty) {
                assertThat(faulty.faults()).isNotEmpty().hasSizeLessThanOrEqualTo(Faults.MOST + 1);
                for (Fault fault : faulty.faults()) {
                    assertThat(fault.at()).matches("|/.*|line [0-9]+, column [0-9]+");
                    assertThat(fault.wrong()).isNotBlank();
                    assertThat(fault.right()).isNotBlank();
                    assertThat(fault.text()).doesNotContainPattern("\\p{Cntrl}").doesNotContain("Exception");
                }
            }
        }
    }

    @Property(tries = 3000)
    void spoiledBytes(@ForAll Random random) {
        byte[] bytes = Samples.bytes(FILES.get(random.nextInt(FILES.size())));
        for (int i = random.nextInt(1, 4); i > 0; i--) {
            int at = random.nextInt(bytes.length);
            if (random.nextBoolean()) {
                bytes[at] = (byte) random.nextInt(256);
            } else {
                bytes[at] = (byte) "{}[],:\"\\0-e. tf\n".charAt(random.nextInt(16));
            }
        }
        check(bytes);
    }

    @Property(tries = 300)
    void cutAndRepeated(@ForAll Random random) {
        String text = FILES.get(random.nextInt(FILES.size()));
        int cut = random.nextInt(text.length());
        check(Samples.bytes(text.substring(0, cut)));
        check(Samples.bytes(text.substring(0, cut) + text.substring(random.nextInt(text.length()))));
    }

    @Property(tries = 3000)
    void spoiledValues(@ForAll Random random) {
        JsonNode root = Samples.tree(FILES.get(random.nextInt(FILES.size())));
        for (int i = random.nextInt(1, 4); i > 0; i--) {
            List<JsonNode> holders = new ArrayList<>();
            collectHolders(root, holders);
            spoil(holders.get(random.nextInt(holders.size())), random);
        }
        check(Samples.bytes(root.toString()));
    }

    @Property(tries = 300)
    void noise(@ForAll byte[] bytes) {
        check(bytes);
    }

    private static void collectHolders(JsonNode node, List<JsonNode> holders) {
        if (node.isContainerNode()) {
            holders.add(node);
            node.forEach(child -> collectHolders(child, holders));
        }
    }

    private static void spoil(JsonNode holder, Random random) {
        JsonNode value = Samples.tree(VALUES.get(random.nextInt(VALUES.size())));
        if (holder instanceof ArrayNode array) {
            if (array.isEmpty() || random.nextInt(4) == 0) {
                array.add(value);
            } else if (random.nextInt(4) == 0) {
                array.remove(random.nextInt(array.size()));
            } else {
                array.set(random.nextInt(array.size()), value);
            }
        } else if (holder instanceof ObjectNode object) {
            List<String> names = new ArrayList<>();
            object.fieldNames().forEachRemaining(names::add);
            if (names.isEmpty() || random.nextInt(8) == 0) {
                object.set("odd" + random.nextInt(10), value);
            } else if (random.nextInt(4) == 0) {
                object.remove(names.get(random.nextInt(names.size())));
            } else {
                object.set(names.get(random.nextInt(names.size())), value);
            }
        }
    }
}
