package shuntwright.planner.window;

import java.nio.file.Path;
import java.util.List;

import javafx.application.Platform;
import javafx.beans.binding.Bindings;
import javafx.beans.value.ObservableBooleanValue;
import javafx.geometry.Orientation;
import javafx.scene.Node;
import javafx.scene.Scene;
import javafx.scene.control.Button;
import javafx.scene.control.Label;
import javafx.scene.control.OverrunStyle;
import javafx.scene.control.Separator;
import javafx.scene.control.SplitPane;
import javafx.scene.control.Tab;
import javafx.scene.control.TabPane;
import javafx.scene.control.TextField;
import javafx.scene.control.ToolBar;
import javafx.scene.control.Tooltip;
import javafx.scene.input.TransferMode;
import javafx.scene.layout.BorderPane;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Priority;
import javafx.scene.layout.Region;
import javafx.scene.layout.StackPane;
import javafx.scene.layout.VBox;

import org.controlsfx.control.StatusBar;
import org.controlsfx.control.textfield.TextFields;

import shuntwright.planner.session.BoardSession;
import shuntwright.planner.session.Documents;
import shuntwright.planner.session.Questions;
import shuntwright.planner.window.budget.BudgetModel;
import shuntwright.planner.window.budget.BudgetPanel;
import shuntwright.planner.window.choice.ChoiceModel;
import shuntwright.planner.window.choice.ChoicePanel;
import shuntwright.planner.window.findings.FindingsModel;
import shuntwright.planner.window.findings.FindingsPanel;
import shuntwright.planner.window.front.FrontModel;
import shuntwright.planner.window.front.FrontPanel;
import shuntwright.planner.window.help.HelpTopic;
import shuntwright.planner.window.others.OthersModel;
import shuntwright.planner.window.others.OthersPanel;
import shuntwright.planner.window.parts.PartsModel;
import shuntwright.planner.window.parts.PartsPanel;
import shuntwright.planner.window.shared.SharedStrip;
import shuntwright.planner.window.shared.SharedStripModel;
import shuntwright.planner.window.table.ChannelTable;
import shuntwright.planner.window.table.ChannelTableModel;
import shuntwright.planner.window.whatif.WhatIfModel;
import shuntwright.planner.window.whatif.WhatIfPanel;
import shuntwright.planner.work.Exploring;
import shuntwright.planner.work.PlanSampling;

/** The content of the window. */
final class MainWindow {
    private final BoardSession session;
    private final Documents documents;
    private final Questions questions;
    private final StatusModel status;
    private final ThemeChoice themes;
    private final SharedStrip strip;
    private final TextField find = TextFields.createClearableTextField();
    private final BorderPane root = new BorderPane();
    private final Runnable close;
    private TextSize textSize = TextSize.NORMAL;

    /**
     * @param exploring answers what might be
     * @param start what can be started from
     * @param close asked to close the window
     */
    MainWindow(BoardSession session, Exploring exploring, Documents documents, Questions questions, StatusModel status,
            ThemeChoice themes, Start start, Runnable close) {
        this.session = session;
        this.documents = documents;
        this.questions = questions;
        this.status = status;
        this.themes = themes;
        this.close = close;
        strip = new SharedStrip(new SharedStripModel(session));
        ChannelTableModel rows = new ChannelTableModel(session);
        ChannelTable table = new ChannelTable(rows);
        rows.filterProperty().bindBidirectional(find.textProperty());
        Commands commands = new Commands(session, documents, themes, start.demos(), start.newParts(), menus());
        SplitPane split = new SplitPane(table.node(), tabs(exploring));
        split.setOrientation(Orientation.VERTICAL);
        split.setDividerPositions(0.56);
        BorderPane work = new BorderPane(split);
        work.setTop(strip.node());
        work.visibleProperty().bind(session.openProperty());
        Node begin = new StartPane(documents, start.demos(), start.newParts()).node();
        begin.visibleProperty().bind(session.openProperty().not());
        VBox top = new VBox(commands.node(), toolBar());
        root.setTop(top);
        root.setCenter(new StackPane(begin, work));
        root.setBottom(statusBar());
        root.getStyleClass().add("shuntwright");
        acceptFiles();
        session.startsProperty().subscribe(count -> {
            if (count.intValue() > 0) {
                Platform.runLater(table::focus);
            }
        });
    }

    /**
     * What can be started from.
     *
     * @param demos    demo boards
     * @param newParts parts files of a new board
     */
    record Start(List<Path> demos, List<Path> newParts) {
        Start {
            demos = List.copyOf(demos);
            newParts = List.copyOf(newParts);
        }
    }

    Scene scene(double width, double height) {
        Scene scene = new Scene(root, width, height);
        themes.themeProperty().subscribe(theme -> theme.apply(scene));
        return scene;
    }

    /** Closes what floats over the window. */
    void closePopUps() {
        strip.closeEditor();
    }

    /** First what is about the selected channel, then what is about the board. */
    private TabPane tabs(Exploring exploring) {
        TabPane tabs = new TabPane(new Tab("Findings", new FindingsPanel(new FindingsModel(session)).node()),
                new Tab("Error budget", new BudgetPanel(new BudgetModel(session), documents).node()),
                new Tab("Other choices", new OthersPanel(new OthersModel(session, exploring)).node()),
                new Tab("Choice", new ChoicePanel(new ChoiceModel(session)).node()),
                new Tab("Front", new FrontPanel(new FrontModel(session, exploring), documents).node()),
                new Tab("What if", new WhatIfPanel(new WhatIfModel(session, exploring), documents).node()),
                new Tab("Parts list", new PartsPanel(new PartsModel(session)).node()));
        tabs.setTabClosingPolicy(TabPane.TabClosingPolicy.UNAVAILABLE);
        tabs.setId("tabs");
        return tabs;
    }

    private ToolBar toolBar() {
        Button open = button("Open", "Open a board (Ctrl+O)", documents::open);
        Button save = whenOpen(button("Save", "Save the board (Ctrl+S)", documents::save));
        Button undo = button("↶ Undo", "", session::undo);
        undo.disableProperty().bind(session.undoNameProperty().isEmpty());
        named(undo, "Undo", session.undoNameProperty());
        Button redo = button("↷ Redo", "", session::redo);
        redo.disableProperty().bind(session.redoNameProperty().isEmpty());
        named(redo, "Redo", session.redoNameProperty());
        Button add = whenOpen(button("+ Channel", "Add a channel (Insert)", () -> session.addChannel("channel")));
        Button duplicate = whenOpen(
                button("Duplicate", "Duplicate the selected channels (Ctrl+D)", session::duplicateSelected));
        Button remove = whenOpen(
                button("Remove", "Remove the selected channels (Ctrl+Delete)", session::removeSelected));
        Button workbook = whenOpen(
                button("Workbook…", "Export the workbook for purchasing and bench (Ctrl+E)",
                        documents::exportWorkbook));
        find.setPromptText("find channel");
        find.setId("find");
        find.setPrefColumnCount(14);
        find.setAccessibleText("Find channel by name");
        find.disableProperty().bind(session.openProperty().not());
        Region space = new Region();
        HBox.setHgrow(space, Priority.ALWAYS);
        return new ToolBar(open, save, new Separator(), undo, redo, new Separator(), add, duplicate, remove,
                new Separator(), workbook, space, find);
    }

    private static Button button(String text, String tip, Runnable action) {
        Button button = new Button(text);
        button.setMnemonicParsing(false);
        button.setOnAction(_ -> action.run());
        if (!tip.isEmpty()) {
            button.setTooltip(new Tooltip(tip));
        }
        return button;
    }

    private static void named(Button button, String verb, javafx.beans.value.ObservableStringValue name) {
        Tooltip tip = new Tooltip();
        tip.textProperty().bind(Bindings.createStringBinding(() -> verb + ": " + name.get(), name));
        button.setTooltip(tip);
        button.accessibleTextProperty().bind(tip.textProperty());
    }

    private Button whenOpen(Button button) {
        button.disableProperty().bind(session.openProperty().not());
        return button;
    }

    private Node statusBar() {
        StatusBar bar = new StatusBar();
        bar.setId("status");
        bar.textProperty().bind(status.textBinding());
        bar.progressProperty().bind(Bindings.when(session.planning().runningProperty())
                .then(session.planning().progressProperty()).otherwise(session.sampling().progressProperty()));
        Button cancel = button("Cancel", "Stop planning; the last plan stays on show", session.planning()::cancel);
        shownWhile(session.planning().runningProperty(), cancel);
        Button keep = button("Keep the best so far", "Look no further; the best choice so far becomes the plan",
                session.planning()::stop);
        keep.setId("keep-best");
        shownWhile(Bindings.createBooleanBinding(() -> session.planning().bestProperty().get().isPresent(),
                session.planning().bestProperty()), keep);
        var sampling = session.sampling().stateProperty();
        Button stop = button("Stop sampling", "Draw no further trials; the best picture so far stays",
                session::stopSampling);
        stop.setId("stop-sampling");
        shownWhile(Bindings.createBooleanBinding(() -> sampling.get() == PlanSampling.State.RUNNING, sampling), stop);
        Button again = button("Sample on", "Draw the trials the board asks for", session::sampleAgain);
        again.setId("sample-again");
        shownWhile(Bindings.createBooleanBinding(() -> sampling.get() == PlanSampling.State.STOPPED
                || sampling.get() == PlanSampling.State.FAILED, sampling), again);
        Label wrong = new Label();
        wrong.setId("wrong-entries");
        wrong.textProperty().bind(status.wrongBinding());
        wrong.getStyleClass().add("wrong-entries");
        wrong.setTextOverrun(OverrunStyle.ELLIPSIS);
        wrong.setMaxWidth(720);
        wrong.visibleProperty().bind(status.wrongBinding().isNotEmpty());
        wrong.managedProperty().bind(wrong.visibleProperty());
        bar.getRightItems().addAll(wrong, keep, cancel, stop, again);
        return bar;
    }

    private static void shownWhile(ObservableBooleanValue condition, Button button) {
        button.visibleProperty().bind(condition);
        button.managedProperty().bind(condition);
    }

    private Commands.Window menus() {
        return new Commands.Window() {
            @Override
            public void close() {
                close.run();
            }

            @Override
            public void find() {
                find.requestFocus();
                find.selectAll();
            }

            @Override
            public void help(HelpTopic topic) {
                questions.tell(topic.title(), topic.title(), topic.lines());
            }

            @Override
            public void scaleText(boolean larger) {
                textSize = larger ? textSize.larger() : textSize.smaller();
                textSize.show(root.getScene().getRoot());
            }
        };
    }

    private void acceptFiles() {
        root.setOnDragOver(event -> {
            if (event.getDragboard().hasFiles()) {
                event.acceptTransferModes(TransferMode.COPY);
            }
            event.consume();
        });
        root.setOnDragDropped(event -> {
            if (event.getDragboard().hasFiles()) {
                documents.open(event.getDragboard().getFiles().getFirst().toPath());
                event.setDropCompleted(true);
            }
            event.consume();
        });
    }
}
