package shuntwright.planner.session;

import java.awt.image.BufferedImage;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.function.Supplier;

import javafx.beans.property.ReadOnlyObjectProperty;
import javafx.beans.property.ReadOnlyObjectWrapper;

import shuntwright.board.Board;
import shuntwright.board.Channel;
import shuntwright.io.json.FileReading;
import shuntwright.io.json.Problem;
import shuntwright.io.save.SaveResult;
import shuntwright.parts.Catalogue;
import shuntwright.planner.session.Questions.Kind;
import shuntwright.planner.work.FileWork;
import shuntwright.planner.work.PlanSampling;

/** Opens, saves and exports the session's board, asking where nothing may be lost. */
public final class Documents {
    private final BoardSession session;
    private final BoardStore store;
    private final Questions questions;
    private final FileWork work;
    private final ReadOnlyObjectWrapper<Optional<Path>> file = new ReadOnlyObjectWrapper<>(Optional.empty());
    private List<Path> moreParts = List.of();

    public Documents(BoardSession session, BoardStore store, Questions questions, FileWork work) {
        this.session = session;
        this.store = store;
        this.questions = questions;
        this.work = work;
    }

    /** The board's file; empty until it is saved. */
    public ReadOnlyObjectProperty<Optional<Path>> fileProperty() {
        return file.getReadOnlyProperty();
    }

    /** @param parts parts files for every board that is opened, besides those it names */
    public void useParts(List<Path> parts) {
        moreParts = List.copyOf(parts);
    }

    /** A board without channels that may use these parts. */
    public void newBoard(List<Path> partsFiles) {
        unlessUnsaved(() -> {
            List<Path> all = new ArrayList<>(moreParts);
            partsFiles.stream().map(Path::toAbsolutePath).filter(path -> !all.contains(path)).forEach(all::add);
            work.run(() -> all.isEmpty() ? new FileReading.Opened<>(Catalogue.EMPTY) : store.catalogue(all),
                    reading -> refusedOr(reading, "the parts", catalogue -> {
                        file.set(Optional.empty());
                        session.start(Board.named("new board").withPartsFiles(
                                partsFiles.stream().map(path -> path.toAbsolutePath().toString()).toList()),
                                catalogue, true);
                    }));
        });
    }

    public void open() {
        unlessUnsaved(() -> questions.fileToOpen(Kind.BOARD).ifPresent(this::read));
    }

    public void open(Path path) {
        unlessUnsaved(() -> read(path));
    }

    /** A file to start from: it is opened, but saving asks for another name. */
    public void openCopy(Path path) {
        unlessUnsaved(() -> work.run(() -> store.open(path, moreParts),
                reading -> refusedOr(reading, path.getFileName().toString(), opened -> {
                    file.set(Optional.empty());
                    Path folder = PartsPaths.folder(path);
                    session.start(opened.board().withPartsFiles(
                            PartsPaths.resolved(opened.board().partsFiles(), folder).stream().map(Path::toString)
                                    .toList()),
                            opened.catalogue(), true);
                })));
    }

    private void read(Path path) {
        work.run(() -> store.open(path, moreParts),
                reading -> refusedOr(reading, path.getFileName().toString(), opened -> {
                    file.set(Optional.of(path));
                    session.start(opened.board(), opened.catalogue(), true);
                }));
    }

    private <T> void refusedOr(FileReading<T> reading, String what, java.util.function.Consumer<T> opened) {
        switch (reading) {
            case FileReading.Opened<T>(T value) -> opened.accept(value);
            case FileReading.Refused<T>(List<Problem> problems) -> questions.tell("Not opened",
                    "Nothing was opened, because of "
                            + (problems.size() == 1 ? "a problem" : problems.size() + " problems") + " in " + what
                            + ". Mend what stands below and open it again; what is on show is as it was.",
                    problems.stream().map(Problem::toString).toList());
        }
    }

    private void savedOr(SaveResult result, java.util.function.Consumer<Path> saved) {
        switch (result) {
            case SaveResult.Saved(Path path) -> saved.accept(path);
            case SaveResult.Failed(String message) ->
                questions.tell("Not saved", "The file is as it was before.", List.of(message));
        }
    }

    public void save() {
        save(() -> {
        });
    }

    public void saveAs() {
        saveAs(() -> {
        });
    }

    private void save(Runnable then) {
        if (file.get().isPresent()) {
            write(file.get().get(), session.state().board(), then);
        } else {
            saveAs(then);
        }
    }

    private void saveAs(Runnable then) {
        Path suggestion = file.get().orElse(Path.of(fileName(session.state().board().name()) + Kind.BOARD.ending()));
        questions.fileToSave(Kind.BOARD, suggestion).ifPresent(target -> {
            Path from = file.get().map(PartsPaths::folder).orElse(Path.of("").toAbsolutePath());
            Board board = session.state().board();
            List<String> parts = PartsPaths.moved(board.partsFiles(), from, PartsPaths.folder(target));
            session.edit("save as " + target.getFileName(), now -> now.withBoard(now.board().withPartsFiles(parts)));
            write(target, session.state().board(), then);
        });
    }

    private void write(Path target, Board board, Runnable then) {
        List<String> left = wrongEntries();
        List<Problem> objections = store.objections(board);
        if (!objections.isEmpty()) {
            questions.tell("Not saved", "The board could not be opened again as it stands. Mend this first:",
                    objections.stream().map(Problem::message).toList());
            return;
        }
        work.run(() -> store.save(board, target), result -> savedOr(result, path -> {
            file.set(Optional.of(path));
            session.markSaved(board);
            if (left.isEmpty()) {
                questions.done("saved " + path.getFileName());
            } else {
                questions.tell("Saved without the wrong entries",
                        "The board is saved with the last good value of these cells. What is typed there stays in the "
                                + "window, but is not in the file:",
                        left);
            }
            then.run();
        }));
    }

    /** One line for each text that could not be taken over. */
    public List<String> wrongEntries() {
        BoardState state = session.state();
        return state.wrong().entrySet().stream().map(each -> switch (each.getKey()) {
            case Place.Cell(int row, var field) -> state.channel(row).map(Channel::name).orElse("") + ", "
                    + field.words() + ": \"" + each.getValue().text() + "\" – " + each.getValue().reason();
            case Place.OfBoard(var field) -> field.title() + ": \"" + each.getValue().text() + "\" – "
                    + each.getValue().reason();
        }).toList();
    }

    public void exportWorkbook() {
        export(Kind.WORKBOOK);
    }

    public void exportPlan() {
        export(Kind.PLAN);
    }

    private void export(Kind kind) {
        Optional<Planned> planned = session.plannedProperty().get();
        if (planned.isEmpty() || !session.currentBinding().get()) {
            questions.tell("Not exported",
                    "The plan of the latest edit is not ready yet, so there is nothing to export "
                            + "that belongs to what is on show.",
                    List.of("Wait until planning has ended, then export again."));
            return;
        }
        if (session.sampling().stateProperty().get() == PlanSampling.State.RUNNING) {
            questions.tell("Not exported",
                    "Trials are still being drawn for the plan on show, so its distributions would not be the ones the "
                            + "board asks for.",
                    List.of("Wait until sampling has ended, or stop it in the status bar to export what was drawn so "
                            + "far; then export again."));
            return;
        }
        questions.fileToSave(kind, suggestion("", kind)).ifPresent(target -> work.run(() -> switch (kind) {
            case WORKBOOK -> store.exportWorkbook(planned.get().plan(), target);
            case PLAN -> store.exportPlan(planned.get().plan(), target);
            case BOARD, PARTS, PICTURE -> throw new IllegalArgumentException(kind + " is not exported");
        }, result -> savedOr(result, path -> questions.done("exported " + path.getFileName()
                + ". Verify the board by test at its temperature extremes; it does not replace the fuse or breaker that "
                + "codes ask for."))));
    }

    /** A file's name beside the board's. */
    private Path suggestion(String of, Kind kind) {
        String board = file.get().map(path -> path.getFileName().toString().replaceFirst("(\\.board)?\\.json$", ""))
                .orElse(fileName(session.state().board().name()));
        String name = board + (of.isEmpty() ? "" : "-" + fileName(of)) + kind.ending();
        return file.get().map(path -> path.resolveSibling(name)).orElse(Path.of(name));
    }

    /**
     * Saves a picture.
     *
     * @param of      what it shows, for the suggested name
     * @param picture made once a file is chosen
     */
    public void savePicture(String of, Supplier<BufferedImage> picture) {
        questions.fileToSave(Kind.PICTURE, suggestion(of, Kind.PICTURE)).ifPresent(target -> {
            BufferedImage drawn = picture.get();
            work.run(() -> store.savePicture(drawn, target),
                    result -> savedOr(result, path -> questions.done("saved " + path.getFileName())));
        });
    }

    /** Adds a parts file to the board. */
    public void addParts() {
        questions.fileToOpen(Kind.PARTS).ifPresent(added -> {
            Path folder = file.get().map(PartsPaths::folder).orElse(Path.of("").toAbsolutePath());
            List<String> names = new ArrayList<>(session.state().board().partsFiles());
            String name = file.get().isPresent()
                    ? PartsPaths.relative(added.toAbsolutePath().normalize(), folder)
                    : added.toAbsolutePath().toString();
            if (!names.contains(name)) {
                names.add(name);
            }
            List<Path> all = new ArrayList<>(PartsPaths.resolved(names, folder));
            moreParts.stream().filter(path -> !all.contains(path)).forEach(all::add);
            work.run(() -> store.catalogue(all),
                    reading -> refusedOr(reading, added.getFileName().toString(), parts -> {
                        session.edit("add parts file " + added.getFileName(),
                                now -> now.withBoard(now.board().withPartsFiles(names)));
                        session.useCatalogue(parts);
                    }));
        });
    }

    /** Does something that would lose unsaved edits only after they are saved or given up. */
    public void unlessUnsaved(Runnable then) {
        boolean wrongOnly = !session.state().wrong().isEmpty();
        if (!session.openProperty().get() || (!session.unsavedProperty().get() && !wrongOnly)) {
            then.run();
            return;
        }
        switch (questions.unsaved(session.state().board().name())) {
            case SAVE -> save(then);
            case DISCARD -> then.run();
            case STAY -> {
                // nothing happens, nothing is lost
            }
        }
    }

    /** Demo boards found in a folder "demo-boards" beside one of these folders or above it. */
    public static List<Path> demoBoards(List<Path> near) {
        for (Path start : near) {
            for (Path folder = start.toAbsolutePath(); folder != null; folder = folder.getParent()) {
                Path demos = folder.resolve("demo-boards");
                if (Files.isDirectory(demos)) {
                    return filesIn(demos, Kind.BOARD);
                }
            }
        }
        return List.of();
    }

    /** Parts files in the folder of the demo boards, for new boards to start with. */
    public static List<Path> partsBeside(List<Path> demoBoards) {
        return demoBoards.isEmpty() ? List.of() : filesIn(PartsPaths.folder(demoBoards.getFirst()), Kind.PARTS);
    }

    private static List<Path> filesIn(Path folder, Kind kind) {
        try (var all = Files.list(folder)) {
            return all.filter(path -> path.toString().endsWith(kind.ending())).sorted().toList();
        } catch (IOException _) {
            return List.of(); // a folder that cannot be listed offers nothing
        }
    }

    private static String fileName(String name) {
        String plain = name.strip().replaceAll("[^\\p{L}\\p{N}]+", "-").replaceAll("^-|-$", "");
        return plain.isEmpty() ? "board" : plain;
    }
}
