/**
 * What was drawn: the design and its file.
 *
 * <p>A {@link tideband.design.Design} is what the user states, checked and inert: nothing in it has been worked out yet. The
 * piece is covered by bands from end A to end B. Each says what it is to be ({@link tideband.design.Wanted}: a film, volts,
 * a colour, or bare metal) and what kind of edge it has towards the next ({@link tideband.design.Edge}).
 *
 * <p>A {@link tideband.design.DesignFile} is JSON (RFC 8259, UTF-8), and so is a {@link tideband.design.BathFile}. Reading
 * one gives a {@link tideband.design.Reading}: what the file holds, or <em>all</em> its faults, each with its place (a JSON
 * pointer, RFC 6901, or line and column where the text is not JSON at all), what is wrong and what would be right. Unknown
 * keys, keys given twice, values of the wrong type and values no bench can have are refused; nothing is put right in
 * silence, and defaults are taken only for keys left out. The keys with their limits and defaults stand in two JSON
 * Schemas (draft 2020-12) beside these classes, {@code tideband-design.schema.json} and {@code tideband-bath.schema.json};
 * what a schema cannot say (that bands rise and cover the piece, that names differ, that a tube is wider than its bore, that
 * the piece goes into its vessel) the reader checks.
 *
 * <p>Left out: whether the drawing can be made. That is the planner's to say.
 */
package tideband.design;
