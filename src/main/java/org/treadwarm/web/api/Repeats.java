package org.treadwarm.web.api;

import io.javalin.http.Context;
import java.nio.charset.StandardCharsets;
import java.security.MessageDigest;
import java.security.NoSuchAlgorithmException;
import java.util.Collections;
import java.util.HexFormat;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import java.util.concurrent.ConcurrentHashMap;
import java.util.function.Supplier;
import java.util.regex.Pattern;
import org.treadwarm.store.KeptAnswer;
import org.treadwarm.store.KeptAnswers;
import org.treadwarm.store.NamedRequest;
import org.treadwarm.store.Once;
import org.treadwarm.web.Problems;
import org.treadwarm.web.security.KeyGuard;

/** Requests that create, and may be sent again without creating twice when they carry an Idempotency-Key. */
final class Repeats {
    /** The header that names a request. */
    static final String HEADER = "Idempotency-Key";

    /** The header that says that an answer was given before. */
    static final String REPLAYED = "Idempotency-Replayed";

    private static final Pattern ALLOWED = Pattern.compile("[\\x21-\\x7e]{1,255}");

    private final KeptAnswers answers;
    private final Set<List<String>> running = ConcurrentHashMap.newKeySet();

    Repeats(KeptAnswers answers) {
        this.answers = answers;
    }

    /**
     * Creates and answers, or answers as before, or says why not.
     *
     * @param creation runs alone against all other changes, so it should only keep what was judged before; empty when it
     *     created nothing and the refusal has been written already
     */
    void create(Context ctx, Supplier<Optional<KeptAnswer>> creation) {
        List<String> names = Collections.list(ctx.req().getHeaders(HEADER));
        if (names.isEmpty()) {
            answer(ctx, creation);
        } else if (names.size() > 1 || !ALLOWED.matcher(names.get(0)).matches()) {
            Problems.plain(
                    ctx,
                    400,
                    "idempotency-key",
                    "The Idempotency-Key cannot be used",
                    "It is sent once, as 1 to 255 visible characters of ASCII.");
        } else {
            createOnce(ctx, new NamedRequest(KeyGuard.key(ctx).id(), names.get(0), sha256(ctx)), creation);
        }
    }

    /** Answers whatever the request is called: sent again, it is done again. */
    void answer(Context ctx, Supplier<Optional<KeptAnswer>> work) {
        work.get().ifPresent(answer -> write(ctx, answer));
    }

    private void createOnce(Context ctx, NamedRequest request, Supplier<Optional<KeptAnswer>> creation) {
        List<String> mark = List.of(request.keyId(), request.name());
        if (!running.add(mark)) {
            ctx.header("Retry-After", "1");
            Problems.plain(
                    ctx,
                    409,
                    "in-progress",
                    "This request is still being answered",
                    "One with the same Idempotency-Key came before; send it again in a second.");
            return;
        }
        try {
            write(ctx, answers.once(request, creation));
        } finally {
            running.remove(mark);
        }
    }

    private static void write(Context ctx, Once outcome) {
        if (outcome instanceof Once.Made made) {
            write(ctx, made.answer());
        } else if (outcome instanceof Once.Repeated repeated) {
            ctx.header(REPLAYED, "true");
            write(ctx, repeated.answer());
        } else if (outcome instanceof Once.Different) {
            Problems.plain(
                    ctx,
                    422,
                    "idempotency-key",
                    "This Idempotency-Key was used for another request",
                    "Within " + KeptAnswers.KEPT.toHours() + " hours a key names one request; nothing was created.");
        }
    }

    private static void write(Context ctx, KeptAnswer answer) {
        ctx.header("Location", answer.location());
        if (!answer.etag().isEmpty()) {
            ctx.header("ETag", answer.etag());
        }
        SizingApi.json(ctx, answer.status(), answer.body().getBytes(StandardCharsets.UTF_8));
    }

    private static String sha256(Context ctx) {
        try {
            MessageDigest digest = MessageDigest.getInstance("SHA-256");
            digest.update((ctx.method() + " " + ctx.path() + "\n").getBytes(StandardCharsets.UTF_8));
            for (String condition : Collections.list(ctx.req().getHeaders("If-Match"))) {
                digest.update(("If-Match " + condition + "\n").getBytes(StandardCharsets.UTF_8));
            }
            return HexFormat.of().formatHex(digest.digest(ctx.bodyAsBytes()));
        } catch (NoSuchAlgorithmException problem) {
            throw new IllegalStateException("Every Java runtime has SHA-256", problem);
        }
    }
}
