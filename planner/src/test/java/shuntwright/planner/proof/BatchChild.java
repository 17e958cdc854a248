package shuntwright.planner.proof;

import java.io.BufferedReader;
import java.io.FileDescriptor;
import java.io.FileInputStream;
import java.io.FileOutputStream;
import java.io.IOException;
import java.io.InputStreamReader;
import java.io.PrintStream;
import java.nio.charset.StandardCharsets;
import java.util.function.BiConsumer;

/** Answers task after task in one process, so that hundreds of them need not start hundreds. */
final class BatchChild {

    private BatchChild() {
    }

    public static void main(String[] args) throws IOException {
        answerAll((task, out) -> ProofChild.answer(task, out, _ -> {
        }));
    }

    /** Calls back with the text of each task until there are no more. */
    static void answerAll(BiConsumer<String, PrintStream> answer) throws IOException {
        PrintStream out = new PrintStream(new FileOutputStream(FileDescriptor.out), false, StandardCharsets.UTF_8);
        BufferedReader in = new BufferedReader(
                new InputStreamReader(new FileInputStream(FileDescriptor.in), StandardCharsets.UTF_8));
        for (String task = ProofChild.task(in); !task.isEmpty(); task = ProofChild.task(in)) {
            answer.accept(task, out);
            out.println("next");
            out.flush();
        }
    }
}
