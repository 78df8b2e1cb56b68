package org.treadwarm.jobs;

import com.fasterxml.jackson.databind.JsonNode;
import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import org.treadwarm.intake.Document;
import org.treadwarm.store.Change;

/** The invented job of the invented firm Quillfen Floors. */
public final class Demo {
    /** The job's name; nothing in it is real. */
    public static final String NAME = "Demo (invented): Quillfen Floors, the Sallowby house";

    private Demo() {}

    /** The demo job's survey. */
    public static JsonNode survey() {
        try (InputStream in = Demo.class.getResourceAsStream("/demo/sallowby-house.json")) {
            return Document.mapper().readTree(in);
        } catch (IOException e) {
            throw new UncheckedIOException("the demo job is missing from the program", e);
        }
    }

    /** Adds the demo job, unless a job of its name is there already. */
    public static void addTo(JobDesk desk) {
        if (desk.list().stream().noneMatch(job -> job.name().equals(NAME))) {
            desk.create(NAME, survey(), new Change("the program", "invented demo"));
        }
    }
}
