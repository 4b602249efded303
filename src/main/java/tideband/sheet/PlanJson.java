package tideband.sheet;

import com.fasterxml.jackson.core.JsonFactory;
import com.fasterxml.jackson.core.JsonGenerator;
import com.fasterxml.jackson.core.util.DefaultIndenter;
import com.fasterxml.jackson.core.util.DefaultPrettyPrinter;
import java.io.IOException;
import java.io.StringWriter;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.List;
import java.util.stream.IntStream;
import tideband.bench.BenchBand;
import tideband.bench.BenchPlan;
import tideband.bench.Caution;
import tideband.colour.Lab;
import tideband.match.FilmColour;
import tideband.oxide.Bath;
import tideband.plan.Cost;
import tideband.plan.Immersion;
import tideband.plan.Run;
import tideband.pull.Pull;
import tideband.pull.Row;
import tideband.trial.TrialBand;

/**
 * The whole plan as JSON, for other programs: UTF-8, keys always in the same order, numbers in plain notation with at
 * most four decimals.
 *
 * <p>The keys, units in their names: {@code cost_min}, {@code lower_bound_min}, {@code proven}; {@code bath}; {@code
 * bands[]}; {@code immersions[]}, each with its {@code pull[]}; {@code trial}; {@code cautions[]}; and more beside them.
 * Of a fade, {@code film_nm}, {@code volts}, {@code lab}, {@code srgb}, {@code order} and {@code name_of_colour} are
 * arrays of two, A-side then B-side; of any other band they are single values ({@code lab} being {@code [L, a, b]}). Of a
 * bare band, {@code volts} is 0. {@code masked}, {@code finishes}, {@code masked_before},
 * {@code stripped_before} and {@code stripped_at_end} are arrays of band names; neighbours among those masked or stripped
 * before an immersion are one run. {@code dE00} is
 * the CIEDE2000 difference between the drawing and the film chosen; {@code dE00_worst} that of the worst place in the
 * trial.
 */
public final class PlanJson {
    private static final int DECIMALS = 4;

    private final BenchPlan plan;
    private final JsonGenerator out;

    private PlanJson(BenchPlan plan, JsonGenerator out) {
        this.plan = plan;
        this.out = out;
    }

    /**
     * The plan as JSON.
     *
     * @param plan the plan
     * @return the file's bytes, with a line end after the last brace
     */
    public static byte[] bytes(BenchPlan plan) {
        // By way of a string, where half a surrogate pair in a name is no error; in UTF-8 it becomes a question mark.
        StringWriter text = new StringWriter();
        DefaultIndenter indenter = new DefaultIndenter("  ", "\n");
        try (JsonGenerator out = JsonFactory.builder().build().createGenerator(text)) {
            out.setPrettyPrinter(new DefaultPrettyPrinter().withObjectIndenter(indenter));
            new PlanJson(plan, out).write();
            out.writeRaw("\n");
        } catch (IOException e) {
            throw new UncheckedIOException("writing to memory failed", e);
        }
        return text.toString().getBytes(StandardCharsets.UTF_8);
    }

    private void write() throws IOException {
        out.writeStartObject();
        out.writeStringField("format", "tideband-plan");
        out.writeNumberField("version", 1);
        out.writeStringField("title", plan.design().title());
        number("cost_min", plan.plan().cost().minutes());
        number("lower_bound_min", plan.plan().lowerBoundMin());
        out.writeBooleanField("proven", plan.plan().proven());
        out.writeStringField("order_rule", plan.design().order().key());
        if (plan.plan().savedByOtherOrderMin().isPresent()) {
            number(
                    "saved_by_other_order_min",
                    plan.plan().savedByOtherOrderMin().getAsDouble());
        }
        cost();
        bath();
        bands();
        out.writeArrayFieldStart("immersions");
        for (int i = 0; i < plan.plan().immersions().size(); i++) {
            immersion(plan.plan().immersions().get(i), plan.pulls().get(i));
        }
        out.writeEndArray();
        runs("stripped_at_end", plan.plan().strippedAtEnd());
        trial();
        cautions();
        out.writeEndObject();
    }

    private void cost() throws IOException {
        Cost cost = plan.plan().cost();
        out.writeObjectFieldStart("cost");
        out.writeNumberField("immersions", cost.immersions());
        out.writeNumberField("runs_masked_first", cost.runsMaskedFirst());
        out.writeNumberField("runs_masked_over", cost.runsMaskedOver());
        out.writeNumberField("runs_stripped", cost.runsStripped());
        out.writeNumberField("turns", cost.turns());
        number("masked_length_mm", cost.maskedLengthMm());
        out.writeEndObject();
    }

    private void bath() throws IOException {
        Bath bath = plan.design().bath();
        out.writeObjectFieldStart("bath");
        out.writeStringField("name", bath.name());
        out.writeStringField("metal", bath.metal().key());
        number("nm_per_volt", bath.nmPerVolt());
        number("field_slope", bath.fieldSlope());
        number("native_nm", bath.nativeNm());
        number("efficiency", bath.efficiency());
        number("resistance_ohm", bath.resistanceOhm());
        number("ceiling_volts", bath.ceilingVolts());
        number("index_scale", bath.indexScale());
        out.writeStringField("source", bath.source());
        out.writeEndObject();
    }

    private void bands() throws IOException {
        out.writeArrayFieldStart("bands");
        for (BenchBand band : plan.bands()) {
            out.writeStartObject();
            out.writeStringField("name", band.name());
            number("from_mm", band.fromMm());
            number("to_mm", band.toMm());
            sides("film_nm", band, c -> number(c.filmNm()));
            out.writeFieldName("volts");
            pair(band.fade(), () -> number(band.aSideVolts()), () -> number(band.bSideVolts()));
            sides("lab", band, c -> lab(c.lab()));
            sides("srgb", band, c -> out.writeString(c.srgbHex()));
            sides("order", band, c -> out.writeNumber(c.order()));
            sides("name_of_colour", band, c -> out.writeString(c.name().text()));
            number("dE00", band.wantedDe00());
            out.writeStringField("wanted_srgb", band.wantedHex());
            out.writeBooleanField("bare", band.bare());
            out.writeStringField("edge", band.crispAtB() ? "crisp" : "soft");
            out.writeEndObject();
        }
        out.writeEndArray();
    }

    private void immersion(Immersion immersion, Pull pull) throws IOException {
        out.writeStartObject();
        out.writeStringField("end_down", immersion.endDown().name());
        runs("masked_before", immersion.maskedBefore());
        runs("stripped_before", immersion.strippedBefore());
        names("masked", immersion.masked());
        names("finishes", immersion.finishes());
        number("peak_nm", immersion.peakNm());
        number("current_limit_A", pull.currentLimitAmps());
        number("peak_current_A", pull.peakAmps());
        number("duration_s", pull.durationS());
        RowWords words = new RowWords(pull, plan.design().supply());
        out.writeArrayFieldStart("pull");
        for (int i = 0; i < pull.rows().size(); i++) {
            Row row = pull.rows().get(i);
            out.writeStartObject();
            number("t_s", row.timeS());
            number("volts", row.volts());
            number("line_mm", row.lineMm());
            number("depth_mm", row.depthMm());
            number("travel_mm", row.travelMm());
            number("film_nm", row.filmNm());
            out.writeStringField("what", words.what(i));
            out.writeEndObject();
        }
        out.writeEndArray();
        texts("why", immersion.why());
        texts("notes", pull.notes());
        out.writeEndObject();
    }

    private void trial() throws IOException {
        out.writeObjectFieldStart("trial");
        out.writeArrayFieldStart("bands");
        for (int i = 0; i < plan.trial().bands().size(); i++) {
            TrialBand band = plan.trial().bands().get(i);
            out.writeStartObject();
            out.writeStringField("name", plan.bands().get(i).name());
            out.writeFieldName("film_nm");
            pair(plan.bands().get(i).fade(), () -> number(band.aSideNm()), () -> number(band.bSideNm()));
            number("dE00_median", band.de00Median());
            number("dE00_worst", band.de00Worst());
            out.writeEndObject();
        }
        out.writeEndArray();
        out.writeEndObject();
    }

    private void cautions() throws IOException {
        out.writeArrayFieldStart("cautions");
        for (Caution caution : plan.cautions()) {
            out.writeString(caution.heading() + ". " + caution.text());
        }
        out.writeEndArray();
    }

    private void runs(String key, List<Run> runs) throws IOException {
        names(
                key,
                runs.stream()
                        .flatMap(run ->
                                IntStream.rangeClosed(run.first(), run.last()).boxed())
                        .toList());
    }

    private void names(String key, List<Integer> bands) throws IOException {
        texts(key, bands.stream().map(i -> plan.bands().get(i).name()).toList());
    }

    private void texts(String key, List<String> texts) throws IOException {
        out.writeArrayFieldStart(key);
        for (String text : texts) {
            out.writeString(text);
        }
        out.writeEndArray();
    }

    private void lab(Lab lab) throws IOException {
        out.writeStartArray();
        number(lab.lightness());
        number(lab.a());
        number(lab.b());
        out.writeEndArray();
    }

    private void sides(String key, BenchBand band, ColourValue value) throws IOException {
        out.writeFieldName(key);
        pair(band.fade(), () -> value.write(band.aSide()), () -> value.write(band.bSide()));
    }

    private void pair(boolean both, Value aSide, Value bSide) throws IOException {
        if (!both) {
            aSide.write();
            return;
        }
        out.writeStartArray();
        aSide.write();
        bSide.write();
        out.writeEndArray();
    }

    private void number(String key, double value) throws IOException {
        out.writeFieldName(key);
        number(value);
    }

    private void number(double value) throws IOException {
        out.writeNumber(Figures.plain(value, DECIMALS));
    }

    /** Writes one value. */
    private interface Value {
        void write() throws IOException;
    }

    /** Writes one value of a colour. */
    private interface ColourValue {
        void write(FilmColour colour) throws IOException;
    }
}
