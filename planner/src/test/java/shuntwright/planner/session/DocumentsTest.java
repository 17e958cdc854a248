package shuntwright.planner.session;

import static org.assertj.core.api.Assertions.assertThat;

import java.awt.image.BufferedImage;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

import shuntwright.board.Board;
import shuntwright.io.boardfile.BoardFiles;
import shuntwright.parts.Catalogue;
import shuntwright.planner.HandMadeBoards;
import shuntwright.planner.HandMadePlans;
import shuntwright.planner.HandMadeStudies;
import shuntwright.planner.Sessions;
import shuntwright.planner.entry.ChannelField;
import shuntwright.planner.work.FileWork;
import shuntwright.planner.work.PlanSampling;
import shuntwright.planner.work.Planning;

class DocumentsTest {
    /** Answers as it is told and remembers what it was told. */
    private static final class Answers implements Questions {
        private Optional<Path> target = Optional.empty();
        private Unsaved unsaved = Unsaved.STAY;
        private final List<String> told = new ArrayList<>();

        @Override
        public Optional<Path> fileToOpen(Kind kind) {
            return target;
        }

        @Override
        public Optional<Path> fileToSave(Kind kind, Path suggestion) {
            told.add("suggested " + suggestion.getFileName());
            return target;
        }

        @Override
        public Unsaved unsaved(String board) {
            return unsaved;
        }

        @Override
        public void tell(String title, String summary, List<String> lines) {
            told.add(title + ": " + String.join("\n", lines));
        }

        @Override
        public void done(String what) {
            told.add(what);
        }
    }

    @TempDir
    private Path folder;

    private final Answers answers = new Answers();
    private final BoardSession session = Sessions.closed();
    private final Documents documents = new Documents(session, new FileBoardStore(), answers,
            new FileWork(Runnable::run, Runnable::run));
    private Path file;

    @BeforeEach
    void open() {
        file = folder.resolve("boat.board.json");
        BoardFiles.save(HandMadeBoards.boat(), file);
        documents.open(file);
    }

    private Board inFile(Path path) {
        return BoardFiles.open(path).ifOpened().orElseThrow();
    }

    @Test
    void opensAndSavesInPlace() {
        assertThat(session.state().board()).isEqualTo(HandMadeBoards.boat());
        session.enter(new Place.Cell(0, ChannelField.LOAD), "19");
        documents.save();
        assertThat(inFile(file)).isEqualTo(session.state().board());
        assertThat(session.unsavedProperty().get()).isFalse();
        assertThat(answers.told).containsExactly("saved boat.board.json");
    }

    @Test
    void aRefusedFileIsToldWithPlacesAndTheOpenBoardStays() throws IOException {
        Path broken = folder.resolve("broken.board.json");
        Files.writeString(broken, "{\"format\": \"shuntwright board 1\",\n \"nam\": \"x\"}");
        documents.open(broken);
        assertThat(answers.told.getFirst()).startsWith("Not opened: broken.board.json:");
        assertThat(session.state().board()).isEqualTo(HandMadeBoards.boat());
        documents.open(folder.resolve("missing.board.json"));
        assertThat(answers.told).hasSize(2);
    }

    @Test
    void savingListsTheWrongEntriesThatAreNotInTheFile() {
        session.enter(new Place.Cell(0, ChannelField.LOAD), "lots");
        documents.save();
        assertThat(answers.told.getLast()).startsWith("Saved without the wrong entries").contains("bilge pump")
                .contains("lots");
        assertThat(inFile(file)).isEqualTo(HandMadeBoards.boat());
        assertThat(session.state().text(new Place.Cell(0, ChannelField.LOAD))).isEqualTo("lots");
    }

    @Test
    void unsavedEditsAreOnlyLostWhenThePersonSaysSo() {
        session.enter(new Place.Cell(0, ChannelField.LOAD), "19");
        Board edited = session.state().board();
        documents.open(file);
        assertThat(session.state().board()).as("board after staying").isEqualTo(edited);
        answers.unsaved = Questions.Unsaved.SAVE;
        List<String> closed = new ArrayList<>();
        documents.unlessUnsaved(() -> closed.add("closed"));
        assertThat(closed).containsExactly("closed");
        assertThat(inFile(file)).isEqualTo(edited);
        session.enter(new Place.Cell(0, ChannelField.LOAD), "18");
        answers.unsaved = Questions.Unsaved.DISCARD;
        documents.open(file);
        assertThat(session.state().board()).as("board after discarding").isEqualTo(edited);
    }

    @Test
    void savingElsewhereNamesThePartsFilesFromThere() throws IOException {
        Path other = Files.createDirectory(folder.resolve("other"));
        session.start(HandMadeBoards.boat().withPartsFiles(List.of("shunts.parts.json")), Catalogue.EMPTY, true);
        answers.target = Optional.of(other.resolve("copy.board.json"));
        documents.saveAs();
        assertThat(inFile(other.resolve("copy.board.json")).partsFiles()).containsExactly("../shunts.parts.json");
        assertThat(documents.fileProperty().get()).contains(other.resolve("copy.board.json"));
    }

    @Test
    void aFailedSaveIsToldAndLeavesTheBoardUnsaved() {
        answers.target = Optional.of(folder.resolve("no such folder").resolve("x.board.json"));
        session.enter(new Place.Cell(0, ChannelField.LOAD), "19");
        documents.saveAs();
        assertThat(answers.told.getLast()).startsWith("Not saved");
        assertThat(session.unsavedProperty().get()).isTrue();
    }

    @Test
    void exportsWorkbookAndPlanBesideTheBoard() {
        answers.target = Optional.of(folder.resolve("boat.xlsx"));
        documents.exportWorkbook();
        assertThat(folder.resolve("boat.xlsx")).isNotEmptyFile();
        assertThat(answers.told).contains("suggested boat.xlsx");
        answers.target = Optional.of(folder.resolve("boat.plan.json"));
        documents.exportPlan();
        assertThat(folder.resolve("boat.plan.json")).content().contains("bilge pump");
        assertThat(answers.told.getLast()).contains("fuse or breaker");
    }

    @Test
    void nothingIsExportedThatDoesNotBelongToTheBoardOnShow() {
        BoardSession waiting = new BoardSession(new Planning(HandMadePlans::plan, _ -> {
        }, Runnable::run), Sessions.sampling(), Sessions.PATIENT);
        Documents early = new Documents(waiting, new FileBoardStore(), answers,
                new FileWork(Runnable::run, Runnable::run));
        early.open(file);
        answers.target = Optional.of(folder.resolve("early.xlsx"));
        early.exportWorkbook();
        assertThat(answers.told.getLast()).startsWith("Not exported");
        assertThat(folder.resolve("early.xlsx")).doesNotExist();
    }

    @Test
    void nothingIsExportedWhileTrialsAreDrawnUnlessTheyAreStopped() {
        BoardSession drawing = new BoardSession(new Planning(HandMadePlans::plan, Runnable::run, Runnable::run),
                new PlanSampling(HandMadeStudies::sample, _ -> {
                }, Runnable::run), Sessions.PATIENT);
        Documents early = new Documents(drawing, new FileBoardStore(), answers,
                new FileWork(Runnable::run, Runnable::run));
        early.open(file);
        answers.target = Optional.of(folder.resolve("early.plan.json"));
        early.exportPlan();
        assertThat(answers.told.getLast()).startsWith("Not exported").contains("stop it in the status bar");
        drawing.stopSampling();
        early.exportPlan();
        assertThat(folder.resolve("early.plan.json")).isNotEmptyFile();
    }

    @Test
    void aPictureIsSavedUnderTheBoardsNameAndWhatItShows() {
        answers.target = Optional.of(folder.resolve("radar.png"));
        documents.savePicture("radar, trip current", () -> new BufferedImage(2, 2, BufferedImage.TYPE_INT_ARGB));
        assertThat(folder.resolve("radar.png")).isNotEmptyFile();
        assertThat(answers.told).contains("suggested boat-radar-trip-current.png", "saved radar.png");
        answers.target = Optional.empty();
        documents.savePicture("radar", () -> {
            throw new AssertionError("no picture is made where no file is chosen");
        });
    }

    @Test
    void findsDemoBoardsAboveAFolder() {
        Path root = Path.of(System.getProperty("shuntwright.root", ".."));
        List<Path> demos = Documents.demoBoards(List.of(folder, root.resolve("planner")));
        assertThat(demos).isNotEmpty().allMatch(path -> path.toString().endsWith(".board.json"));
        assertThat(Documents.partsBeside(demos)).isNotEmpty();
    }

    @Test
    void aDemoBoardIsACopyThatAsksForANameOnSaving() {
        Path root = Path.of(System.getProperty("shuntwright.root", ".."));
        Path demo = Documents.demoBoards(List.of(root)).getFirst();
        documents.openCopy(demo);
        assertThat(documents.fileProperty().get()).isEmpty();
        assertThat(session.catalogueProperty().get().shunts()).isNotEmpty();
        answers.target = Optional.of(folder.resolve("mine.board.json"));
        documents.save();
        documents.open(folder.resolve("mine.board.json"));
        assertThat(session.catalogueProperty().get().shunts()).as("shunts of the saved copy").isNotEmpty();
    }
}
