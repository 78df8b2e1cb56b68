package org.treadwarm.commands;

import java.io.IOException;
import java.io.PrintStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.concurrent.Callable;
import org.treadwarm.intake.Document;
import org.treadwarm.intake.NotJsonException;
import org.treadwarm.jobs.Judgement;
import org.treadwarm.sizing.Sizing;
import org.treadwarm.survey.Survey;
import org.treadwarm.wire.Json;
import org.treadwarm.wire.PlainSheet;
import org.treadwarm.wire.ProblemDocument;
import picocli.CommandLine.Command;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;

/** Sizes survey files: the answer of each on its own line, or a readable sheet. */
@Command(
        name = "size",
        description = "Size survey files. The answers go to standard output, one line a file; exit status 2 when a"
                + " survey is refused.",
        mixinStandardHelpOptions = true)
public final class SizeCommand implements Callable<Integer> {
    private static final int REFUSED = 2;

    @Parameters(paramLabel = "FILE", arity = "1..*", description = "survey files; - reads standard input")
    private List<String> files;

    @Option(names = "--plain", description = "print a readable sheet instead of JSON")
    private boolean plain;

    @Option(names = "--working", description = "add the working: formula, source and inputs of every number")
    private boolean working;

    @Override
    public Integer call() throws IOException {
        PrintStream out = new PrintStream(
                new java.io.FileOutputStream(java.io.FileDescriptor.out), false, StandardCharsets.UTF_8);
        PrintStream err = new PrintStream(
                new java.io.FileOutputStream(java.io.FileDescriptor.err), false, StandardCharsets.UTF_8);
        int status = 0;
        for (String file : files) {
            Outcome outcome = size(file);
            if (outcome.refused()) {
                status = REFUSED;
            }
            PrintStream stream = outcome.refused() && files.size() == 1 ? err : out;
            stream.write(outcome.text());
            stream.println();
        }
        out.flush();
        err.flush();
        return status;
    }

    private record Outcome(boolean refused, byte[] text) {}

    private Outcome size(String file) {
        try {
            byte[] text = file.equals("-") ? System.in.readAllBytes() : Files.readAllBytes(Path.of(file));
            Judgement judged = Judgement.of(Document.read(text));
            if (judged.sizing().isEmpty()) {
                return refused(ProblemDocument.invalid(judged.problems()));
            }
            return new Outcome(
                    false, answer(judged.survey().orElseThrow(), judged.sizing().get()));
        } catch (NotJsonException e) {
            return refused(ProblemDocument.notJson(e.problem()));
        } catch (IOException | java.nio.file.InvalidPathException e) {
            return refused(ProblemDocument.unreadable(file));
        }
    }

    private byte[] answer(Survey survey, Sizing sizing) {
        if (plain) {
            String sheet = PlainSheet.of(survey, sizing);
            return (working ? sheet + "\n\n" + PlainSheet.working(survey, sizing) : sheet)
                    .getBytes(StandardCharsets.UTF_8);
        }
        return working ? Json.withWorking(survey, sizing) : Json.bytes(sizing);
    }

    private static Outcome refused(ProblemDocument problem) {
        return new Outcome(true, Json.bytes(problem));
    }
}
