/**
 * Opening, saving, recovering designs.
 *
 * <p>{@link tideband.window.files.FilesModel} decides; it asks the user through {@link tideband.window.files.Asks}, which
 * {@link tideband.window.files.FilesView} answers with dialogs and tests answer beforehand. A drawing counts as changed while
 * it differs, as a value, from the one on disk. Half a second after an edit it is kept in the recovery store, beside the
 * screen's thread.
 */
package tideband.window.files;
