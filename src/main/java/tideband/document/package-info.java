/**
 * Designs as documents on disk, without a screen.
 *
 * <p>A {@link tideband.document.DocumentFile} opens and saves. Whatever is written is written whole beside its place, brought
 * to the disk and moved there, so that no crash and no full disk leaves half a file. A bath that is no preset has a file beside
 * the design's, which other designs may name: it is never replaced unasked. A {@link tideband.document.DiskStamp} tells what
 * files held, so that a change by another program is noticed.
 *
 * <p>{@link tideband.document.Recovery} keeps open drawings where they are found again after a crash, {@link
 * tideband.document.RecentFiles} and {@link tideband.document.Preferences} are small files that may be damaged without harm;
 * all live in the {@link tideband.document.StateFolder}. A drawing begins with a {@link tideband.document.Sample} or a {@link
 * tideband.document.StartingShape}.
 */
package tideband.document;
