package shuntwright.planner.window.dialog;

import java.io.File;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Optional;
import java.util.function.Supplier;

import javafx.stage.FileChooser;
import javafx.stage.Window;

import shuntwright.planner.session.Questions.Kind;

/** The file choosers of the system. */
public final class SystemChoosers implements Choosers {
    private final Supplier<Window> owner;
    private Optional<File> lastFolder = Optional.empty();

    public SystemChoosers(Supplier<Window> owner) {
        this.owner = owner;
    }

    @Override
    public Optional<Path> open(Kind kind) {
        FileChooser chooser = chooser("Open a " + kind.word() + " file", kind);
        return taken(Optional.ofNullable(chooser.showOpenDialog(owner.get())));
    }

    @Override
    public Optional<Path> save(Kind kind, Path suggestion) {
        FileChooser chooser = chooser("Save the " + kind.word(), kind);
        chooser.setInitialFileName(suggestion.getFileName().toString());
        Path folder = suggestion.toAbsolutePath().getParent();
        if (suggestion.isAbsolute() && folder != null && Files.isDirectory(folder)) {
            chooser.setInitialDirectory(folder.toFile());
        }
        return taken(Optional.ofNullable(chooser.showSaveDialog(owner.get()))).map(path -> ended(path, kind));
    }

    private Optional<Path> taken(Optional<File> file) {
        lastFolder = file.map(File::getParentFile).or(() -> lastFolder);
        return file.map(File::toPath);
    }

    /** The path with the kind's ending, unless the person typed one. */
    static Path ended(Path path, Kind kind) {
        String name = path.getFileName().toString();
        return name.contains(".") ? path : path.resolveSibling(name + kind.ending());
    }

    private FileChooser chooser(String title, Kind kind) {
        FileChooser chooser = new FileChooser();
        chooser.setTitle(title);
        chooser.getExtensionFilters().addAll(
                new FileChooser.ExtensionFilter("Shuntwright " + kind.word() + " (*" + kind.ending() + ")",
                        "*" + kind.ending()),
                new FileChooser.ExtensionFilter("All files", "*"));
        lastFolder.filter(File::isDirectory).ifPresent(chooser::setInitialDirectory);
        return chooser;
    }
}
