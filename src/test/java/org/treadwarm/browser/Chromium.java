package org.treadwarm.browser;

import com.microsoft.playwright.Browser;
import com.microsoft.playwright.BrowserType.LaunchOptions;
import com.microsoft.playwright.Playwright;
import java.io.File;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Arrays;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.stream.Stream;
import org.junit.jupiter.api.extension.ExtensionContext;
import org.junit.jupiter.api.extension.ExtensionContext.Namespace;
import org.junit.jupiter.api.extension.ParameterContext;
import org.junit.jupiter.api.extension.ParameterResolver;

/** Gives tests the browser of this machine, started once for all of them. */
public final class Chromium implements ParameterResolver {
    private static final List<String> ARGUMENTS = List.of(
            "--no-sandbox",
            "--disable-gpu",
            "--disable-quic",
            "--no-first-run",
            "--disable-background-networking",
            "--disable-component-update",
            "--disable-sync");

    private record Running(Playwright playwright, Browser browser) implements AutoCloseable {
        static Running start() {
            Playwright playwright = Playwright.create(
                    new Playwright.CreateOptions().setEnv(Map.of("PLAYWRIGHT_SKIP_BROWSER_DOWNLOAD", "1")));
            return new Running(
                    playwright,
                    playwright
                            .chromium()
                            .launch(new LaunchOptions()
                                    .setExecutablePath(executable())
                                    .setArgs(ARGUMENTS)
                                    .setHeadless(true)));
        }

        @Override
        public void close() {
            playwright.close();
        }
    }

    private static Path executable() {
        Stream<String> named = Stream.of(System.getProperty("chromium"), System.getenv("CHROMIUM"))
                .filter(path -> path != null && !path.isBlank());
        Stream<String> found = Arrays.stream(
                        Optional.ofNullable(System.getenv("PATH")).orElse("").split(File.pathSeparator))
                .map(folder -> folder + File.separator + "chromium");
        return Stream.concat(named, found)
                .map(Path::of)
                .filter(Files::isExecutable)
                .findFirst()
                .orElseThrow(() -> new IllegalStateException("These tests need a Chromium: install the Debian package"
                        + " \"chromium\", or name the program with -Dchromium=PATH or the variable CHROMIUM."));
    }

    @Override
    public boolean supportsParameter(ParameterContext parameter, ExtensionContext context) {
        return parameter.getParameter().getType() == Browser.class;
    }

    @Override
    public Browser resolveParameter(ParameterContext parameter, ExtensionContext context) {
        return context.getRoot()
                .getStore(Namespace.create(Chromium.class))
                .getOrComputeIfAbsent(Running.class, key -> Running.start(), Running.class)
                .browser();
    }
}
