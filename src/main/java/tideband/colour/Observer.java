package tideband.colour;

/** The CIE's two standard colorimetric observers (ISO/CIE 11664-1). */
public enum Observer {
    /** CIE 1931, for fields of about 2 degrees. */
    CIE_1931_2_DEGREE(2, "observer-1931.csv"),
    /** CIE 1964, for fields of about 10 degrees. */
    CIE_1964_10_DEGREE(10, "observer-1964.csv");

    private final int fieldDegrees;
    private final String resource;

    Observer(int fieldDegrees, String resource) {
        this.fieldDegrees = fieldDegrees;
        this.resource = resource;
    }

    /**
     * The number this observer goes by in files and on the command line.
     *
     * @return the field of view in degrees, 2 or 10
     */
    public int key() {
        return fieldDegrees;
    }

    /**
     * The observer of a field of view.
     *
     * @param fieldDegrees 2 or 10
     * @return the observer
     * @throws IllegalArgumentException for any other number
     */
    public static Observer ofKey(int fieldDegrees) {
        for (Observer observer : values()) {
            if (observer.fieldDegrees == fieldDegrees) {
                return observer;
            }
        }
        throw new IllegalArgumentException("observer must be 2 or 10 (degrees), but was " + fieldDegrees);
    }

    SpectralTable colourMatchingFunctions() {
        return SpectralTable.read(Observer.class, resource);
    }
}
