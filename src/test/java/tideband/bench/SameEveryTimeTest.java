package tideband.bench;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import java.util.Locale;
import java.util.TimeZone;
import java.util.stream.IntStream;
import org.junit.jupiter.api.Test;
import tideband.design.Design;

/** Property: one design is worked out in one way, whoever's computer it is. */
final class SameEveryTimeTest {

    private static List<Work> works() {
        RandomDesigns random = new RandomDesigns();
        return IntStream.range(0, 60)
                .mapToObj(RandomDesigns::design)
                .filter(design -> design.bands().size() <= 6)
                .map(random::work)
                .toList();
    }

    @Test
    void underAnyLocaleAndTimeZone() {
        Locale locale = Locale.getDefault();
        TimeZone zone = TimeZone.getDefault();
        List<Work> first = works();
        try {
            for (String tag : List.of("de-DE", "tr-TR", "ar-SA-u-nu-arab", "hi-IN-u-nu-deva")) {
                Locale.setDefault(Locale.forLanguageTag(tag));
                TimeZone.setDefault(TimeZone.getTimeZone("Pacific/Chatham"));
                assertThat(works()).as(tag).isEqualTo(first);
            }
        } finally {
            Locale.setDefault(locale);
            TimeZone.setDefault(zone);
        }
    }

    @Test
    void withFreshColours() {
        Design design = RandomDesigns.design(3);
        assertThat(BenchPlanner.work(design)).isEqualTo(BenchPlanner.work(design));
    }

    @Test
    void whileDrawingAsAfterwards() {
        for (int lot = 0; lot < 40; lot++) {
            Design design = RandomDesigns.design(lot);
            BenchPlanner planner = new BenchPlanner(design, Colours.of(design));
            Work whole = planner.work(stage -> {}, () -> false);
            Work quick = planner.workWhileDrawing(() -> false);
            if (whole instanceof Work.Worked done && quick instanceof Work.Worked sketched) {
                assertThat(sketched.plan().plan().immersions())
                        .isEqualTo(done.plan().plan().immersions());
                assertThat(sketched.plan().pulls()).isEqualTo(done.plan().pulls());
                assertThat(sketched.plan().trial()).isEqualTo(done.plan().trial());
            } else {
                assertThat(quick).isEqualTo(whole);
            }
        }
    }
}
