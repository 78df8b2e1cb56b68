package org.treadwarm.jobs;

import com.fasterxml.jackson.databind.JsonNode;
import java.nio.charset.StandardCharsets;
import java.security.MessageDigest;
import java.security.NoSuchAlgorithmException;
import java.util.HexFormat;
import org.treadwarm.store.RevisionHeader;

/**
 * A room as it stands in one revision of its job.
 *
 * @param job the revision of the job
 * @param id the room's id
 * @param room the room as it was typed; a copy, free to change
 */
public record RoomVersion(RevisionHeader job, String id, JsonNode room) {
    /** The SHA-256 of the room's text: it changes with the room alone, not with the rest of the job. */
    public String tag() {
        try {
            byte[] text = room.toString().getBytes(StandardCharsets.UTF_8);
            return HexFormat.of().formatHex(MessageDigest.getInstance("SHA-256").digest(text));
        } catch (NoSuchAlgorithmException e) {
            throw new IllegalStateException("every Java machine has SHA-256", e);
        }
    }
}
