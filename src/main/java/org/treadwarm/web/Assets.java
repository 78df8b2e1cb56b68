package org.treadwarm.web;

import io.javalin.config.RoutesConfig;
import io.javalin.http.Context;
import io.javalin.http.NotFoundResponse;
import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.util.Map;
import java.util.Objects;
import java.util.concurrent.ConcurrentHashMap;
import java.util.regex.Pattern;
import java.util.zip.CRC32C;
import org.treadwarm.web.security.Access;

/**
 * The style sheet, the script and the pictures of the pages, out of the program itself.
 *
 * <p>The server library would mount the whole jar as a file system for this and read the list of its ten thousand
 * entries at every start.
 */
final class Assets {
    private static final Pattern NAME = Pattern.compile("([a-z0-9-]+/)*[a-z0-9-]+\\.(css|js|svg|png)");
    private static final Map<String, String> TYPES = Map.of(
            "css", "text/css; charset=utf-8",
            "js", "text/javascript; charset=utf-8",
            "svg", "image/svg+xml",
            "png", "image/png");

    private final Map<String, Asset> loaded = new ConcurrentHashMap<>();

    private record Asset(byte[] bytes, String type, String tag) {}

    void routes(RoutesConfig routes) {
        routes.get("/static/<name>", this::give, Access.ANYBODY);
        routes.head("/static/<name>", this::give, Access.ANYBODY);
    }

    private void give(Context ctx) {
        String name = ctx.pathParam("name");
        if (!NAME.matcher(name).matches()) {
            throw new NotFoundResponse();
        }
        Asset asset = loaded.computeIfAbsent(name, Assets::load);
        if (asset == null) {
            throw new NotFoundResponse();
        }
        ctx.header("Cache-Control", "no-cache");
        ctx.header("ETag", asset.tag());
        if (Objects.equals(ctx.header("If-None-Match"), asset.tag())) {
            ctx.status(304);
            return;
        }
        ctx.contentType(asset.type());
        ctx.result(asset.bytes());
    }

    /** Null when the program holds no such file, so that nothing is remembered of names that clients make up. */
    private static Asset load(String name) {
        try (InputStream file = Assets.class.getResourceAsStream("/static/" + name)) {
            if (file == null) {
                return null;
            }
            byte[] bytes = file.readAllBytes();
            CRC32C sum = new CRC32C();
            sum.update(bytes);
            String type = TYPES.get(name.substring(name.lastIndexOf('.') + 1));
            return new Asset(bytes, type, "\"" + Long.toHexString(sum.getValue()) + "-" + bytes.length + "\"");
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }
}
