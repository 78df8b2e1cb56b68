package org.treadwarm.commands;

import java.io.FileDescriptor;
import java.io.FileOutputStream;
import java.io.PrintStream;
import java.nio.charset.StandardCharsets;
import java.util.List;
import java.util.Locale;
import java.util.concurrent.Callable;
import org.treadwarm.checks.CheckedValue;
import org.treadwarm.checks.PublishedChecks;
import picocli.CommandLine.Command;

/** Runs every published check: a line each, exit status 1 if any fails. */
@Command(
        name = "check",
        description =
                "Compute every published value that the program is held to, a line each; exit status 1 if any fails.",
        mixinStandardHelpOptions = true)
public final class CheckCommand implements Callable<Integer> {
    @Override
    public Integer call() {
        PrintStream out = new PrintStream(new FileOutputStream(FileDescriptor.out), false, StandardCharsets.UTF_8);
        List<CheckedValue> values = PublishedChecks.all();
        for (CheckedValue value : values) {
            out.println(line(value));
        }
        long failed = values.stream().filter(value -> !value.passes()).count();
        out.println(values.size() + " values, " + (values.size() - failed) + " pass, " + failed + " fail");
        out.flush();
        return failed == 0 ? 0 : 1;
    }

    private static String line(CheckedValue value) {
        return String.format(
                Locale.ROOT,
                "%s  %s %s  expected %s  got %s  deviation %s (allowed %s)  confidence %s  source: %s",
                value.passes() ? "pass" : "FAIL",
                value.caseId(),
                value.what(),
                number(value.expected()),
                number(value.got()),
                number(value.deviation()),
                number(value.tolerance()),
                value.confidence(),
                value.source());
    }

    private static String number(double number) {
        return String.format(Locale.ROOT, "%.6g", number);
    }
}
