package tideband.sheet;

import java.util.List;

/** One thing drawn; all lengths in mm, {@code x} to the right and {@code y} down. */
sealed interface Mark {

    /** Hands this mark to the writer of a format. */
    void to(Writer writer);

    /** What the writer of a format must know how to draw. */
    interface Writer {
        void box(Box box);

        void shape(Shape shape);

        void line(Line line);

        void words(Words words);
    }

    /** Which point of a line of text its position names. */
    enum Anchor {
        /** Its left end. */
        START,
        /** Its middle. */
        MIDDLE,
        /** Its right end. */
        END
    }

    /**
     * An upright rectangle.
     *
     * @param xMm its left side
     * @param yMm its top
     * @param widthMm its width
     * @param heightMm its height
     * @param ink how it is painted
     */
    record Box(double xMm, double yMm, double widthMm, double heightMm, Ink ink) implements Mark {
        @Override
        public void to(Writer writer) {
            writer.box(this);
        }
    }

    /**
     * A closed polygon.
     *
     * @param corners its corners in order
     * @param ink how it is painted
     */
    record Shape(List<Point> corners, Ink ink) implements Mark {
        public Shape {
            corners = List.copyOf(corners);
        }

        @Override
        public void to(Writer writer) {
            writer.shape(this);
        }
    }

    /**
     * A straight line.
     *
     * @param from one end
     * @param to the other
     * @param hex its colour
     * @param widthMm its width
     * @param dashMm length of its dashes and of the gaps between them; 0 for an unbroken line
     */
    record Line(Point from, Point to, String hex, double widthMm, double dashMm) implements Mark {
        public Line {
            Ink.requireHex(hex);
        }

        @Override
        public void to(Writer writer) {
            writer.line(this);
        }
    }

    /**
     * A line of text.
     *
     * @param text the text, made clean
     * @param at a point of its baseline
     * @param sizeMm the type size
     * @param bold whether it is bold
     * @param anchor which point of the line {@code at} is
     * @param hex its colour
     */
    record Words(String text, Point at, double sizeMm, boolean bold, Anchor anchor, String hex) implements Mark {
        public Words {
            text = Typeface.clean(text);
            Ink.requireHex(hex);
        }

        double widthMm() {
            return Typeface.widthMm(text, sizeMm, bold);
        }

        double leftMm() {
            return switch (anchor) {
                case START -> at.xMm();
                case MIDDLE -> at.xMm() - widthMm() / 2;
                case END -> at.xMm() - widthMm();
            };
        }

        @Override
        public void to(Writer writer) {
            writer.words(this);
        }
    }
}
