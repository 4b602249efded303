package tideband.window.sheets;

import java.util.List;
import javafx.application.Platform;
import javafx.scene.Node;
import javafx.scene.control.Button;
import javafx.scene.control.ComboBox;
import javafx.scene.control.Label;
import javafx.scene.control.ProgressBar;
import javafx.scene.control.ScrollPane;
import javafx.scene.control.Tooltip;
import javafx.scene.input.KeyCode;
import javafx.scene.layout.BorderPane;
import javafx.scene.layout.FlowPane;
import javafx.scene.layout.VBox;
import javafx.util.StringConverter;
import tideband.bench.Obstacle;
import tideband.sheet.SheetPrinter;
import tideband.window.comfort.ComfortModel;
import tideband.window.look.Look;

/** What the user sees of an errand: one face for each standing, always with a way on and a way out. Escape is the way out. */
public final class SheetsView extends BorderPane {
    private final SheetsModel model;
    private final Label heading = new Label();
    private final ProgressBar bar = new ProgressBar(0);
    private final Label stage = SheetsFormView.plain("");
    private PagesView pages;
    private Standing faced = new Standing.Idle();

    /**
     * A view; see {@link SheetsDialogView} for the window it stands in.
     *
     * @param model what it shows
     * @param comfort what suits the user
     */
    public SheetsView(SheetsModel model, ComfortModel comfort) {
        this.model = model;
        getStylesheets().add(SheetsView.class.getResource("sheets.css").toExternalForm());
        getStyleClass().add("sheets");
        Look.dress(this, comfort);
        heading.getStyleClass().add("heading");
        VBox head = new VBox(heading);
        head.getStyleClass().add("sheets-head");
        setTop(head);
        bar.setMaxWidth(Double.MAX_VALUE);
        bar.setAccessibleText("Progress");
        setOnKeyPressed(e -> {
            if (e.getCode() == KeyCode.ESCAPE) {
                out();
                e.consume();
            }
        });
        model.standingProperty().addListener((value, before, after) -> show(after));
        show(model.standingProperty().get());
    }

    private void out() {
        Standing standing = model.standingProperty().get();
        boolean step = standing instanceof Standing.InTheWay
                || (standing instanceof Standing.Asked asked && asked.errand() == Errand.PRINT);
        if (step) {
            model.back();
        } else {
            model.close();
        }
    }

    private void show(Standing standing) {
        boolean goesOn = standing instanceof Standing.Working && faced instanceof Standing.Working;
        faced = standing;
        if (goesOn) {
            progress((Standing.Working) standing);
            return;
        }
        if (pages != null) {
            pages.dispose();
            pages = null;
        }
        if (standing instanceof Standing.Asked asked) {
            asked(asked);
        } else if (standing instanceof Standing.InTheWay inTheWay) {
            inTheWay(inTheWay);
        } else if (standing instanceof Standing.Working working) {
            working(working);
        } else if (standing instanceof Standing.Shown shown) {
            shown(shown);
        } else if (standing instanceof Standing.Written written) {
            face(written.errand().title(), body(text(written.said()), list(written.names())), List.of(closing("Done")));
        } else if (standing instanceof Standing.Printed printed) {
            face(Errand.PRINT.title(), body(text(printed.said())), List.of(closing("Done")));
        } else if (standing instanceof Standing.Refused refused) {
            refused(refused);
        } else if (standing instanceof Standing.Failed failed) {
            Label what = text(failed.said());
            what.getStyleClass().add("warning");
            face(
                    failed.errand().title() + ": not done",
                    body(what),
                    List.of(closing("Close"), going("Back", model::back)));
        } else if (standing instanceof Standing.CalledOff off) {
            face(off.errand().title(), body(text(off.said())), List.of(going("Back", model::back), closing("Close")));
        } else {
            setCenter(null);
            setBottom(null);
        }
    }

    private void asked(Standing.Asked asked) {
        SheetsFormView form = new SheetsFormView(model.form(), asked.errand(), model::write);
        Button write = going(asked.errand() == Errand.EXPORT ? "Write the files" : "Write the PDF", model::write);
        write.disableProperty().bind(model.form().faultProperty().isNotEmpty());
        Button cancel = asked.errand() == Errand.EXPORT ? closing("Cancel") : going("Back", model::back);
        face(asked.errand().title(), scrolling(form), List.of(cancel, write));
        Platform.runLater(() -> {
            // What a scroll pane holds is in the scene only once that is laid out.
            applyCss();
            layout();
            form.requestFocus();
        });
    }

    private void inTheWay(Standing.InTheWay inTheWay) {
        face(
                inTheWay.errand().title() + ": replace files?",
                body(text(inTheWay.said()), list(inTheWay.names())),
                List.of(
                        going(inTheWay.names().size() == 1 ? "Replace it" : "Replace them", model::replace),
                        going("Keep, go back", model::back)));
    }

    private void working(Standing.Working working) {
        Button cancel = going("Cancel", model::cancel);
        cancel.setTooltip(new Tooltip("Stops at the next stage (Escape)"));
        face(working.errand().title(), body(stage, bar), List.of(cancel));
        progress(working);
    }

    private void progress(Standing.Working working) {
        stage.setText(working.said());
        bar.setProgress(working.share());
        bar.setAccessibleText("Progress: " + working.said());
    }

    private void shown(Standing.Shown shown) {
        pages = new PagesView(model.pages(), shown.sheets());
        ComboBox<SheetPrinter> printers = printers(shown.sheets());
        boolean none = shown.sheets().printers().isEmpty();
        Button pdf = going("Write a PDF\u2026", model::askForPdf);
        pdf.setTooltip(new Tooltip("Writes the step sheet to a file, to be printed from there"));
        Button print = going("Print", () -> model.printOn(printers.getValue()));
        print.setTooltip(new Tooltip("Prints all pages at full size"));
        VBox foot = new VBox();
        FlowPane buttons =
                none ? foot(List.of(closing("Close"), pdf)) : foot(List.of(closing("Close"), pdf, printers, print));
        if (none) {
            Label why = text(shown.said());
            why.setStyle("-fx-padding: 0.5em 1em 0 1em;");
            foot.getChildren().add(why);
        }
        foot.getChildren().add(buttons);
        heading.setText(Errand.PRINT.title());
        setCenter(pages);
        setBottom(foot);
        Platform.runLater(() -> {
            if (pages != null) {
                pages.requestFocus();
            }
        });
    }

    private static ComboBox<SheetPrinter> printers(ShownSheets sheets) {
        ComboBox<SheetPrinter> printers = new ComboBox<>();
        printers.getItems().setAll(sheets.printers());
        printers.setConverter(new StringConverter<>() {
            @Override
            public String toString(SheetPrinter printer) {
                return printer == null ? "" : printer.name();
            }

            @Override
            public SheetPrinter fromString(String text) {
                throw new UnsupportedOperationException("the choice is not typed");
            }
        });
        sheets.printers().stream().findFirst().ifPresent(printers::setValue);
        printers.setAccessibleText("Printer");
        printers.setTooltip(new Tooltip("The printer"));
        return printers;
    }

    private void refused(Standing.Refused refused) {
        VBox body = new VBox(text(refused.said()));
        body.getStyleClass().add("sheets-body");
        for (Obstacle obstacle : refused.obstacles()) {
            Label where = text(obstacle.where() + ": " + obstacle.reason() + ".");
            Label change = text("What would work: " + obstacle.change() + ".");
            where.getStyleClass().add("warning");
            VBox both = new VBox(where, change);
            if (obstacle.where().startsWith("band ")) {
                Button go = going("Go to " + obstacle.where(), () -> model.point(obstacle));
                go.setTooltip(new Tooltip("Selects the band in the drawing"));
                both.getChildren().add(go);
            }
            both.setStyle("-fx-spacing: 0.3em;");
            body.getChildren().add(both);
        }
        face(refused.errand().title() + ": not yet", scrolling(body), List.of(closing("Close")));
    }

    private void face(String title, Node body, List<Node> buttons) {
        heading.setText(title);
        setCenter(body);
        FlowPane foot = foot(buttons);
        setBottom(foot);
        // The last button is the way on; it gets the focus, so that Enter and a screen reader find it.
        Node last = buttons.get(buttons.size() - 1);
        Platform.runLater(last::requestFocus);
    }

    private static FlowPane foot(List<Node> buttons) {
        FlowPane foot = new FlowPane();
        foot.getStyleClass().add("sheets-foot");
        foot.getChildren().setAll(buttons);
        return foot;
    }

    private Button closing(String name) {
        Button button = going(name, model::close);
        button.setCancelButton(true);
        return button;
    }

    private static Button going(String name, Runnable act) {
        Button button = new Button(name);
        button.setOnAction(e -> act.run());
        button.setAccessibleText(name);
        return button;
    }

    private static Node body(Node... nodes) {
        VBox body = new VBox(nodes);
        body.getStyleClass().add("sheets-body");
        return scrolling(body);
    }

    private static ScrollPane scrolling(Node node) {
        ScrollPane scroll = new ScrollPane(node);
        scroll.setFitToWidth(true);
        scroll.getStyleClass().add("sheets-scroll");
        scroll.setFocusTraversable(false);
        return scroll;
    }

    private static Label text(String text) {
        return SheetsFormView.plain(text);
    }

    private static Label list(List<String> names) {
        Label list = text(String.join("\n", names));
        list.getStyleClass().add("faint");
        return list;
    }
}
