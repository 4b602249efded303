package tideband.architecture;

import static com.tngtech.archunit.lang.syntax.ArchRuleDefinition.classes;
import static com.tngtech.archunit.lang.syntax.ArchRuleDefinition.fields;
import static com.tngtech.archunit.lang.syntax.ArchRuleDefinition.noClasses;
import static com.tngtech.archunit.library.dependencies.SlicesRuleDefinition.slices;
import static org.assertj.core.api.Assertions.assertThat;

import com.tngtech.archunit.base.DescribedPredicate;
import com.tngtech.archunit.core.domain.JavaClass;
import com.tngtech.archunit.core.domain.JavaClasses;
import com.tngtech.archunit.core.domain.JavaField;
import com.tngtech.archunit.core.domain.JavaModifier;
import com.tngtech.archunit.core.importer.ClassFileImporter;
import com.tngtech.archunit.core.importer.ImportOption;
import com.tngtech.archunit.lang.ArchCondition;
import com.tngtech.archunit.lang.ConditionEvents;
import com.tngtech.archunit.lang.SimpleConditionEvent;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.TreeSet;
import org.junit.jupiter.api.Test;

/** Keeps the shape of the program: which package may know which, and what stays in one place. */
class ArchitectureTest {
    private static final JavaClasses ALL = new ClassFileImporter()
            .withImportOption(new ImportOption.DoNotIncludeTests())
            .importPackages("tideband");

    /** Each package with all it may know. Decision 0001. */
    private static final Map<String, Set<String>> MAY_KNOW = new LinkedHashMap<>();

    static {
        MAY_KNOW.put("colour", Set.of());
        MAY_KNOW.put("optics", Set.of("colour"));
        MAY_KNOW.put("oxide", Set.of());
        MAY_KNOW.put("piece", Set.of());
        MAY_KNOW.put("design", Set.of("colour", "optics", "oxide", "piece"));
        MAY_KNOW.put("match", Set.of("colour", "optics"));
        MAY_KNOW.put("plan", Set.of("design", "piece"));
        MAY_KNOW.put("pull", Set.of("design", "oxide", "piece", "plan"));
        MAY_KNOW.put("trial", Set.of("colour", "match", "oxide", "piece", "pull"));
        MAY_KNOW.put("bench", Set.of("colour", "optics", "oxide", "piece", "design", "match", "plan", "pull", "trial"));
        MAY_KNOW.put(
                "sheet",
                Set.of("colour", "optics", "oxide", "piece", "design", "match", "plan", "pull", "trial", "bench"));
        MAY_KNOW.put("edit", Set.of("colour", "optics", "oxide", "piece", "design"));
        MAY_KNOW.put("document", Set.of("colour", "optics", "oxide", "piece", "design", "edit"));
        MAY_KNOW.put("pacer", Set.of("oxide", "piece", "design", "plan", "pull", "bench", "sheet"));
        MAY_KNOW.put(
                "window",
                Set.of(
                        "colour",
                        "optics",
                        "oxide",
                        "piece",
                        "design",
                        "match",
                        "plan",
                        "pull",
                        "trial",
                        "bench",
                        "sheet",
                        "edit",
                        "document",
                        "pacer"));
        MAY_KNOW.put(
                "cli",
                Set.of(
                        "colour", "optics", "oxide", "piece", "design", "match", "plan", "pull", "trial", "bench",
                        "sheet", "window"));
    }

    private static String roomOf(String packageName) {
        String[] parts = packageName.split("\\.", -1);
        return parts.length > 1 ? parts[1] : "";
    }

    @Test
    void everyRoomIsKnown() {
        Set<String> rooms = new TreeSet<>();
        ALL.forEach(c -> rooms.add(roomOf(c.getPackageName())));
        assertThat(rooms).isEqualTo(new TreeSet<>(MAY_KNOW.keySet()));
    }

    @Test
    void arrowsGoOneWay() {
        MAY_KNOW.forEach((room, known) -> {
            List<String> forbidden = new ArrayList<>();
            for (String other : MAY_KNOW.keySet()) {
                if (!other.equals(room) && !known.contains(other)) {
                    forbidden.add("tideband." + other + "..");
                }
            }
            noClasses()
                    .that()
                    .resideInAPackage("tideband." + room + "..")
                    .should()
                    .dependOnClassesThat()
                    .resideInAnyPackage(forbidden.toArray(new String[0]))
                    .because("data flows design, match, plan, pull, trial, sheet and not back (decision 0001)")
                    .allowEmptyShould(true)
                    .check(ALL);
        });
        slices().matching("tideband.(*)..").should().beFreeOfCycles().check(ALL);
        slices().matching("tideband.window.(*)..").should().beFreeOfCycles().check(ALL);
    }

    @Test
    void librariesStayInTheirRooms() {
        keep("org.apache.batik..", "sheet");
        keep("org.apache.pdfbox..", "sheet");
        keep("com.fasterxml.jackson..", "design", "sheet");
        keep("picocli..", "cli");
        keep("java.awt..", "sheet");
        keep("javafx..", "window");
    }

    @Test
    void viewModelsKnowNoViews() {
        noClasses()
                .that()
                .haveNameMatching(".*Model(\\$.*)?")
                .should()
                .dependOnClassesThat()
                .resideInAnyPackage(
                        "javafx.scene..", "javafx.stage..", "javafx.application..", "tideband.window.look..")
                .orShould()
                .dependOnClassesThat()
                .haveNameMatching(".*View(\\$.*)?")
                .because("what a view-model decides must be testable without a screen (decision 0005)")
                .check(ALL);
    }

    private static void keep(String library, String... rooms) {
        String[] allowed = new String[rooms.length];
        for (int i = 0; i < rooms.length; i++) {
            allowed[i] = "tideband." + rooms[i] + "..";
        }
        noClasses()
                .that()
                .resideOutsideOfPackages(allowed)
                .should()
                .dependOnClassesThat()
                .resideInAPackage(library)
                .because("a library that is known everywhere can never be exchanged (decision 0001)")
                .check(ALL);
    }

    @Test
    void onlyTheCommandLineTalks() {
        noClasses()
                .that()
                .resideOutsideOfPackage("tideband.cli..")
                .should()
                .accessField(System.class, "out")
                .orShould()
                .accessField(System.class, "err")
                .because("the core returns values; data goes to standard output by the commands alone")
                .check(ALL);
    }

    @Test
    void nothingStaticChanges() {
        fields().that()
                .areStatic()
                .and()
                .doNotHaveName("$VALUES")
                .should()
                .beFinal()
                .because("static state makes results depend on what ran before")
                .check(ALL);
    }

    @Test
    void recordsHoldNoArrays() {
        classes()
                .that(new DescribedPredicate<JavaClass>("are records") {
                    @Override
                    public boolean test(JavaClass type) {
                        return type.isRecord();
                    }
                })
                .should(new ArchCondition<JavaClass>("hold no arrays") {
                    @Override
                    public void check(JavaClass type, ConditionEvents events) {
                        for (JavaField field : type.getFields()) {
                            boolean array = field.getRawType().isArray()
                                    && !field.getModifiers().contains(JavaModifier.STATIC);
                            if (array) {
                                events.add(SimpleConditionEvent.violated(field, field.getFullName() + " is an array"));
                            }
                        }
                    }
                })
                .because("arrays break the equality and the immutability of a record")
                .check(ALL);
    }

    @Test
    void namesSayWhatThingsAre() {
        noClasses()
                .should()
                .haveNameMatching(".*(Utils?|Helpers?|Manager|Misc|Common)")
                .because("such a name says nothing of what is inside")
                .check(ALL);
    }

    @Test
    void everyRoomHasItsPage() {
        for (String room : MAY_KNOW.keySet()) {
            assertThat(Path.of("src/main/java/tideband", room, "package-info.java"))
                    .as("the page that teaches %s", room)
                    .exists();
        }
    }
}
