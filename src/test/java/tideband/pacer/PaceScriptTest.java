package tideband.pacer;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.Test;
import tideband.bench.BenchPlan;
import tideband.bench.Colours;
import tideband.bench.PacedPlans;
import tideband.pull.Row;
import tideband.sheet.Figures;
import tideband.sheet.HandMark;
import tideband.sheet.TimingCsv;

/** Property: the script says what the rows and the printed timing table say. */
class PaceScriptTest {
    private static final List<BenchPlan> PLANS = PacedPlans.all();

    private interface Check {
        void of(BenchPlan plan, int immersion, PaceScript script);
    }

    private static void each(Check check) {
        for (BenchPlan plan : PLANS) {
            for (int i = 0; i < plan.pulls().size(); i++) {
                check.of(plan, i, new PaceScript(plan, i));
            }
        }
    }

    @Test
    void atEveryMarkTheMomentIsTheTable() {
        each((plan, i, script) -> {
            List<HandMark> marks =
                    HandMark.of(plan.pulls().get(i), plan.design().supply());
            assertThat(script.calls()).hasSameSizeAs(marks);
            for (int m = 0; m < marks.size(); m++) {
                Row row = marks.get(m).row();
                Moment moment = script.at(row.timeS());
                assertThat(moment.markIndex()).isEqualTo(m);
                assertThat(moment.now().mark()).isEqualTo(marks.get(m));
                assertThat(moment.setting())
                        .isEqualTo(new Setting(row.volts(), row.depthMm(), row.travelMm(), row.lineMm(), row.filmNm()));
                assertThat(moment.now().clock()).isEqualTo(Figures.clock(row.timeS()));
                assertThat(moment.now().volts())
                        .isEqualTo(marks.get(m).volts(plan.design().supply()));
                boolean last = m + 1 == marks.size();
                assertThat(moment.next().isEmpty()).isEqualTo(last);
                assertThat(moment.leftS())
                        .isCloseTo(last ? 0 : marks.get(m + 1).row().timeS() - row.timeS(), within(1e-9));
            }
        });
    }

    @Test
    void marksAreThoseOfTheTimingFile() {
        for (String name : List.of("carry-bail", "wick-pin", "burner-tube")) {
            BenchPlan plan = PacedPlans.shipped(name);
            List<String> lines = new String(TimingCsv.bytes(plan, Colours.of(plan.design())), StandardCharsets.UTF_8)
                    .lines()
                    .filter(line -> !line.startsWith("#") && !line.startsWith("immersion"))
                    .toList();
            List<String> starts = new ArrayList<>();
            for (int i = 0; i < plan.pulls().size(); i++) {
                for (Call call : new PaceScript(plan, i).calls()) {
                    starts.add((i + 1) + ","
                            + plan.plan().immersions().get(i).endDown() + ","
                            + Figures.plain(call.dueS(), 2) + "," + call.clock() + ",");
                }
            }
            assertThat(lines).hasSameSizeAs(starts);
            for (int i = 0; i < lines.size(); i++) {
                assertThat(lines.get(i)).startsWith(starts.get(i));
            }
        }
    }

    @Test
    void betweenRowsVoltsAndDepthRunStraight() {
        each((plan, i, script) -> {
            List<Row> rows = plan.pulls().get(i).rows();
            for (int r = 1; r < rows.size(); r++) {
                Row from = rows.get(r - 1);
                Row to = rows.get(r);
                if (to.timeS() <= from.timeS()) {
                    continue;
                }
                for (double share : new double[] {0.1, 0.5, 0.9}) {
                    Setting setting = script.at(from.timeS() + share * (to.timeS() - from.timeS()))
                            .setting();
                    assertThat(setting.volts())
                            .isCloseTo(from.volts() + share * (to.volts() - from.volts()), within(1e-6));
                    assertThat(setting.depthMm())
                            .isCloseTo(from.depthMm() + share * (to.depthMm() - from.depthMm()), within(1e-6));
                    assertThat(setting.lineMm())
                            .isCloseTo(from.lineMm() + share * (to.lineMm() - from.lineMm()), within(1e-6));
                    assertThat(setting.travelMm())
                            .isCloseTo(from.travelMm() + share * (to.travelMm() - from.travelMm()), within(1e-6));
                    assertThat(setting.filmNm())
                            .isBetween(from.filmNm() - 1e-9, Math.max(from.filmNm(), to.filmNm()) + 1e-9);
                }
            }
        });
    }

    @Test
    void filmInAHoldGrowsQuicklyAtFirst() {
        PaceScript script = new PaceScript(PacedPlans.shipped("lantern-hook"), 0);
        double endNm = script.calls().get(1).mark().row().filmNm();
        // High-field growth: most of the film of a hold of 30 s is there after a tenth of it.
        assertThat(script.at(3).setting().filmNm()).isBetween(0.8 * endNm, endNm);
        assertThat(script.growthNmPerS(1)).isGreaterThan(script.growthNmPerS(29));
        assertThat(script.growthNmPerS(32)).isZero();
    }

    @Test
    void voltsAreCalledAsTheTableHasThem() {
        PaceScript bail = new PaceScript(PacedPlans.shipped("carry-bail"), 0);
        Moment follow = bail.at(38);
        assertThat(follow.now().line()).isEqualTo("ON \u00b7 FOLLOW to 88.6 mm");
        assertThat(follow.volts()).startsWith("(").endsWith(")");
        assertThat(bail.at(33).volts()).isEqualTo("off");
        assertThat(bail.at(33).now().words()).isEqualTo("OFF \u00b7 DRAW");
        assertThat(bail.at(33).live()).isFalse();
        assertThat(bail.at(bail.durationS()).now().words()).isEqualTo("RINSE");
        PaceScript tube = new PaceScript(PacedPlans.shipped("burner-tube"), 0);
        assertThat(tube.at(1).now().line()).isEqualTo("ON \u00b7 RAISE to 38.0 V");
        assertThat(tube.at(0).live()).isTrue();
        assertThat(tube.at(8).now().line()).isEqualTo("HOLD at 38.0 V");
        PaceScript plate = new PaceScript(PacedPlans.shipped("vent-plate"), 0);
        assertThat(plate.at(31).now().words()).isEqualTo("SET \u00b7 FADE");
        assertThat(plate.at(31).now().volts()).isEqualTo("21.9");
    }

    @Test
    void theSupplySwitchesWhereVoltsComeAndGo() {
        each((plan, i, script) -> {
            boolean live = false;
            for (Call call : script.calls()) {
                Moment moment = script.at(call.dueS());
                assertThat(call.switches()).as(call.line()).isEqualTo(live != moment.live());
                assertThat(call.words().startsWith("ON")).isEqualTo(!live && moment.live());
                live = moment.live();
            }
            assertThat(live).isFalse();
        });
    }

    @Test
    void aFadeAtFixedVoltsIsAnnouncedWithItsSetting() {
        int seen = 0;
        for (BenchPlan plan : PLANS) {
            for (int i = 0; i < plan.pulls().size(); i++) {
                PaceScript script = new PaceScript(plan, i);
                for (int m = 1; m < script.calls().size(); m++) {
                    boolean follow = script.calls().get(m).mark().row().act() == Row.Act.FOLLOW;
                    boolean before = script.calls().get(m - 1).mark().row().act() == Row.Act.FOLLOW;
                    if (follow && !before) {
                        seen++;
                        assertThat(script.supplyHint(m - 1))
                                .startsWith("Set the supply to ")
                                .contains("current limit at");
                    } else if (!follow
                            && before
                            && script.at(script.calls().get(m).dueS()).live()) {
                        assertThat(script.supplyHint(m - 1)).startsWith("Set the current limit back to");
                    } else if (follow) {
                        assertThat(script.supplyHint(m - 1)).isEmpty();
                    }
                }
            }
        }
        assertThat(seen).isPositive();
    }

    @Test
    void limitsAgreeWithTheCautionsOfThePlan() {
        each((plan, i, script) -> {
            double mostVolts = plan.pulls().stream()
                    .flatMap(p -> p.rows().stream())
                    .mapToDouble(Row::volts)
                    .max()
                    .orElseThrow();
            TouchLimit.exceededBy(mostVolts)
                    .ifPresent(limit -> assertThat(plan.cautions())
                            .anyMatch(c -> c.heading().endsWith("over " + (int) limit.aboveV() + " V")));
            script.calls()
                    .forEach(call -> assertThat(script.at(call.dueS())
                                    .limit()
                                    .map(TouchLimit::aboveV)
                                    .orElse(0.0))
                            .isLessThanOrEqualTo(mostVolts));
        });
    }

    @Test
    void preparationNamesEveryMaskAndEndsBeforeTheCountIn() {
        each((plan, i, script) -> {
            List<Step> steps = script.preparation();
            assertThat(steps.get(0).heading()).isEqualTo("SUPPLY OFF");
            assertThat(steps.get(steps.size() - 1).heading()).isEqualTo("HANDS CLEAR");
            plan.cautions()
                    .forEach(c -> assertThat(steps)
                            .anyMatch(s -> (s.heading() + ". " + s.text()).contains(c.heading() + ". " + c.text())));
            assertThat(steps.stream().filter(s -> s.heading().equals("MASK")))
                    .hasSameSizeAs(plan.plan().immersions().get(i).maskedBefore());
            assertThat(steps.stream().filter(s -> s.heading().equals("STRIP")))
                    .hasSameSizeAs(plan.plan().immersions().get(i).strippedBefore());
            boolean turned = i > 0
                    && plan.plan().immersions().get(i).endDown()
                            != plan.plan().immersions().get(i - 1).endDown();
            assertThat(steps.stream().anyMatch(s -> s.heading().equals("TURN"))).isEqualTo(turned);
            for (String note : script.notes()) {
                assertThat(steps).anyMatch(s -> s.text().equals(note));
            }
        });
    }
}
