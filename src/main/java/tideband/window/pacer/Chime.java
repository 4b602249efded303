package tideband.window.pacer;

import tideband.pacer.Tone;

/** What makes the pacer heard. */
public interface Chime {

    /**
     * Sounds a tone without waiting for its end.
     *
     * @param tone the tone
     */
    void sound(Tone tone);

    /**
     * What is wrong with it.
     *
     * @return a sentence, or nothing while all is well
     */
    String trouble();

    /** Gives the sound device back. */
    void close();
}
