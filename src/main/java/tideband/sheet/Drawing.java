package tideband.sheet;

import java.util.List;

/**
 * A finished drawing, or one page.
 *
 * @param widthMm its width in mm
 * @param heightMm its height in mm
 * @param title its title, for readers that show or speak one
 * @param description what it shows, in words, for people who cannot see it
 * @param marks what is drawn, the first at the back
 */
record Drawing(double widthMm, double heightMm, String title, String description, List<Mark> marks) {
    Drawing {
        title = Typeface.clean(title);
        description = Typeface.clean(description);
        marks = List.copyOf(marks);
    }
}
