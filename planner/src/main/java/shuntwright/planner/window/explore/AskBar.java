package shuntwright.planner.window.explore;

import javafx.beans.binding.Bindings;
import javafx.beans.value.ObservableBooleanValue;
import javafx.beans.value.ObservableStringValue;
import javafx.css.PseudoClass;
import javafx.scene.Node;
import javafx.scene.control.Button;
import javafx.scene.control.Label;
import javafx.scene.control.ProgressBar;
import javafx.scene.layout.HBox;

import shuntwright.planner.session.Asked;

/** A button that asks; while it is answered, progress and a button that cancels; then what is to be said of the answer. */
public final class AskBar {
    private static final PseudoClass STALE = PseudoClass.getPseudoClass("stale");

    private final HBox bar = new HBox();

    /**
     * @param id       of the buttons
     * @param words    on the button
     * @param possible whether it can be asked
     * @param said     of the answer, in words
     */
    public AskBar(String id, String words, Asked<?> asked, ObservableBooleanValue possible,
            ObservableStringValue said, Runnable ask) {
        var running = asked.inquiry().runningProperty();
        Button button = new Button(words);
        button.setId(id);
        button.setMnemonicParsing(false);
        button.getStyleClass().add("ask-button");
        button.disableProperty().bind(running.or(Bindings.createBooleanBinding(() -> !possible.get(), possible)));
        button.setOnAction(_ -> ask.run());
        ProgressBar progress = new ProgressBar();
        progress.setPrefWidth(140);
        progress.progressProperty().bind(asked.inquiry().progressProperty());
        Label stage = new Label();
        stage.textProperty().bind(Bindings.concat(asked.inquiry().stageProperty(), " …"));
        Button cancel = new Button("Cancel");
        cancel.setId(id + "-cancel");
        cancel.setMnemonicParsing(false);
        cancel.setOnAction(_ -> asked.cancel());
        Label after = new Label();
        after.setId(id + "-said");
        after.textProperty().bind(Bindings.createStringBinding(
                () -> asked.messageProperty().get().isEmpty() ? said.get() : asked.messageProperty().get(),
                asked.messageProperty(), said));
        after.getStyleClass().add("ask-said");
        asked.staleProperty().subscribe(stale -> after.pseudoClassStateChanged(STALE, stale));
        bar.getChildren().addAll(button, progress, stage, cancel, after);
        for (Node each : new Node[]{progress, stage, cancel}) {
            shownWhile(running, each);
        }
        shownWhile(running.not(), after);
        bar.getStyleClass().add("ask-bar");
    }

    private static void shownWhile(ObservableBooleanValue condition, Node node) {
        node.visibleProperty().bind(condition);
        node.managedProperty().bind(condition);
    }

    /** The control for the panel. */
    public HBox node() {
        return bar;
    }
}
