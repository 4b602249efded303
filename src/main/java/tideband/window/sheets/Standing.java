package tideband.window.sheets;

import java.nio.file.Path;
import java.util.List;
import tideband.bench.Obstacle;

/** Where an errand has got to. */
public sealed interface Standing {

    /**
     * Where it has got to, in sentences: what happened, and what to do.
     *
     * @return the sentences; empty where there is nothing to say
     */
    String said();

    /** Nothing is asked for. */
    record Idle() implements Standing {
        @Override
        public String said() {
            return "";
        }
    }

    /**
     * The user says where the files are to go.
     *
     * @param errand what they are written for
     */
    record Asked(Errand errand) implements Standing {
        @Override
        public String said() {
            return "";
        }
    }

    /**
     * Files are in the way.
     *
     * @param errand what they are in the way of
     * @param folder the folder they are in
     * @param names their names
     */
    record InTheWay(Errand errand, Path folder, List<String> names) implements Standing {
        // Copies the list, so that the value cannot change.
        public InTheWay {
            names = List.copyOf(names);
        }

        @Override
        public String said() {
            String which = names.size() == 1 ? "1 file is" : names.size() + " files are";
            return which + " already in " + folder + " and will be replaced.";
        }
    }

    /**
     * It is being done.
     *
     * @param errand what is being done
     * @param stage what is going on, in a few words
     * @param share how much of it is behind, 0 to 1
     * @param stopping whether the user has called it off
     */
    record Working(Errand errand, String stage, double share, boolean stopping) implements Standing {
        @Override
        public String said() {
            return stopping
                    ? "Stopping \u2026"
                    : Character.toUpperCase(stage.charAt(0)) + stage.substring(1) + " \u2026";
        }
    }

    /**
     * The pages are there to be looked at.
     *
     * @param sheets the pages
     */
    record Shown(ShownSheets sheets) implements Standing {
        @Override
        public String said() {
            return sheets.said();
        }
    }

    /**
     * Files were written.
     *
     * @param errand what they were written for
     * @param folder the folder they are in
     * @param files the files
     */
    record Written(Errand errand, Path folder, List<Path> files) implements Standing {
        // Copies the list, so that the value cannot change.
        public Written {
            files = List.copyOf(files);
        }

        /**
         * The names of the files.
         *
         * @return the names
         */
        public List<String> names() {
            return files.stream().map(f -> f.getFileName().toString()).toList();
        }

        @Override
        public String said() {
            return errand == Errand.PRINT
                    ? "The step sheet has been written to " + files.get(0)
                            + ". Open it and print it from there, at full size and not fitted to the page: the gauges are"
                            + " laid on the piece."
                    : files.size() + " files have been written to " + folder + ".";
        }
    }

    /**
     * The printer has the sheets.
     *
     * @param printer the printer's name
     * @param pages how many pages it was given
     */
    record Printed(String printer, int pages) implements Standing {
        @Override
        public String said() {
            return pages + (pages == 1 ? " page has" : " pages have") + " been given to the printer " + printer
                    + ". Check the ruler on a gauge page against a real one before you use the gauges.";
        }
    }

    /**
     * The design cannot be made, so there are no sheets.
     *
     * @param errand what cannot be done
     * @param obstacles each reason, with the nearest change that would work
     */
    record Refused(Errand errand, List<Obstacle> obstacles) implements Standing {
        // Copies the list, so that the value cannot change.
        public Refused {
            obstacles = List.copyOf(obstacles);
        }

        @Override
        public String said() {
            return "There are no sheets yet, for the drawing cannot be made as it is. "
                    + (obstacles.size() == 1 ? "This stands" : obstacles.size() + " things stand") + " in the way:";
        }
    }

    /**
     * Something went wrong.
     *
     * @param errand what was not done
     * @param what what happened
     * @param change what to do
     */
    record Failed(Errand errand, String what, String change) implements Standing {
        @Override
        public String said() {
            return what + " " + change;
        }
    }

    /**
     * The user called it off.
     *
     * @param errand what was not done
     * @param atPrinter whether the printer had been given pages already
     */
    record CalledOff(Errand errand, boolean atPrinter) implements Standing {
        @Override
        public String said() {
            if (atPrinter) {
                return "Stopped. Pages the printer already has may still come out; throw them away.";
            }
            return errand == Errand.EXPORT
                    ? "Stopped. Nothing was written, and nothing was changed."
                    : "Stopped. Nothing was printed.";
        }
    }
}
