/**
 * The sheets: what is handed to the person at the bench, and to other programs.
 *
 * <p>Every picture is first a {@code Drawing}: an immutable list of marks (boxes, shapes, lines, words) in millimetres,
 * {@code x} to the right and {@code y} down. Two small writers turn a drawing into SVG or PDF; nothing else knows of
 * those formats. The same plan gives the same bytes on every run, in any locale and time zone.
 *
 * <p>Text that comes from a design (titles, names) is only ever text: it is measured, cut and replaced where a font or a
 * format cannot hold it, and it can open no tag, no operator and no cell.
 *
 * <p>Start at {@code Exports}, which writes all files of a plan. One at a time: {@code PreviewSvg} (the piece as it will
 * look), {@code StepSheetPdf} (what to do), {@code TimingCsv} (the pulls) and {@code PlanJson} (the whole plan).
 */
package tideband.sheet;
