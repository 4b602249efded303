package tideband.document;

import tideband.design.Design;

/**
 * A design as it stands on disk.
 *
 * @param design the design
 * @param stamp what its files held
 */
public record Opened(Design design, DiskStamp stamp) {}
