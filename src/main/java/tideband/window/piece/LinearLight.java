package tideband.window.piece;

import tideband.colour.Srgb;

/** Screen colours in linear light, where lights add, and back to eight bits a channel (IEC 61966-2-1, equations 5 to 7). */
final class LinearLight {
    private static final int BUCKETS = 4096;

    /** The smallest linear value that rounds to each channel value, and one beyond any. */
    private static final float[] LEAST = new float[257];

    /** The channel value of the lower end of each bucket; at most one step of the channel falls into a bucket. */
    private static final int[] GUESS = new int[BUCKETS + 1];

    static {
        for (int value = 1; value < 256; value++) {
            LEAST[value] = (float) decode((value - 0.5) / 255);
        }
        LEAST[256] = Float.MAX_VALUE;
        int value = 0;
        for (int bucket = 0; bucket <= BUCKETS; bucket++) {
            while (LEAST[value + 1] <= (float) bucket / BUCKETS) {
                value++;
            }
            GUESS[bucket] = value;
        }
    }

    private LinearLight() {}

    /**
     * A channel in linear light.
     *
     * @param encoded channel of an sRGB colour, 0 to 1
     * @return linear value, 0 to 1
     */
    static double decode(double encoded) {
        return encoded <= 0.04045 ? encoded / 12.92 : Math.pow((encoded + 0.055) / 1.055, 2.4);
    }

    /**
     * Writes a colour's three channels in linear light.
     *
     * @param colour the colour
     * @param into takes them
     * @param at index of the first
     */
    static void put(Srgb colour, float[] into, int at) {
        into[at] = (float) decode(colour.red());
        into[at + 1] = (float) decode(colour.green());
        into[at + 2] = (float) decode(colour.blue());
    }

    /**
     * A channel in eight bits, rounded exactly.
     *
     * @param linear linear value; what lies outside 0 to 1 is taken to the nearer end
     * @return 0 to 255
     */
    static int eightBits(float linear) {
        if (!(linear > 0)) {
            return 0;
        }
        if (linear >= 1) {
            return 255;
        }
        int guess = GUESS[(int) (linear * BUCKETS)];
        return linear >= LEAST[guess + 1] ? guess + 1 : guess;
    }
}
