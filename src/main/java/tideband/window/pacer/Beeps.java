package tideband.window.pacer;

import tideband.pacer.Tone;

/** Makes the tones: sines with soft ends, 16 bit, one channel, least byte first. */
final class Beeps {
    private static final double LOUDNESS = 0.6 * Short.MAX_VALUE;
    private static final double SOFT_END_S = 0.005;
    private static final double GAP_S = 0.06;

    private Beeps() {}

    static byte[] of(Tone tone, double rateHz) {
        return switch (tone) {
            case TICK -> beeps(rateHz, 0.03, 1200);
            case MARK -> beeps(rateHz, 0.14, 880);
            case SUPPLY -> beeps(rateHz, 0.14, 880, 1320);
            case END -> beeps(rateHz, 0.2, 1320, 1100, 880);
            case ALARM -> beeps(rateHz, 0.18, 440, 440, 440);
        };
    }

    private static byte[] beeps(double rateHz, double eachS, double... hertz) {
        int each = (int) (eachS * rateHz);
        int gap = (int) (GAP_S * rateHz);
        byte[] bytes = new byte[2 * (hertz.length * (each + gap))];
        for (int beep = 0; beep < hertz.length; beep++) {
            int start = beep * (each + gap);
            for (int i = 0; i < each; i++) {
                double edgeS = Math.min(i, each - 1 - i) / rateHz;
                double swell = Math.min(1, edgeS / SOFT_END_S);
                int sample = (int) Math.round(LOUDNESS * swell * Math.sin(2 * Math.PI * hertz[beep] * i / rateHz));
                bytes[2 * (start + i)] = (byte) sample;
                bytes[2 * (start + i) + 1] = (byte) (sample >> 8);
            }
        }
        return bytes;
    }
}
