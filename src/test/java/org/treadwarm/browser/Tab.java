package org.treadwarm.browser;

import com.microsoft.playwright.Browser;
import com.microsoft.playwright.BrowserContext;
import com.microsoft.playwright.Locator;
import com.microsoft.playwright.Page;
import com.microsoft.playwright.options.Cookie;
import com.microsoft.playwright.options.ReducedMotion;
import java.util.ArrayList;
import java.util.List;
import org.treadwarm.store.Session;
import org.treadwarm.web.RunningServer;

/** One tab of a browser, and whatever it complained about. */
final class Tab implements AutoCloseable {
    /** The server gives a computation up after two minutes; milliseconds. */
    private static final double LONGEST_COMPUTATION = 130_000;

    private final RunningServer server;
    private final BrowserContext context;
    private final Page page;
    private final boolean touch;
    private final List<String> complaints = new ArrayList<>();

    private Tab(RunningServer server, Browser browser, Browser.NewContextOptions options, boolean touch) {
        this.server = server;
        this.touch = touch;
        this.context = browser.newContext(
                options.setBaseURL(server.origin()).setHasTouch(touch).setReducedMotion(ReducedMotion.REDUCE));
        this.context.setDefaultTimeout(20_000);
        this.page = context.newPage();
        // Chromium itself reports an answer of 4xx or 5xx to a navigation as an error; that is no fault of the page.
        page.onConsoleMessage(message -> {
            if (!message.type().equals("log") && !message.text().startsWith("Failed to load resource")) {
                complaints.add(message.type() + ": " + message.text());
            }
        });
        page.onPageError(complaints::add);
        page.onRequestFailed(request -> complaints.add(request.failure() + " " + request.url()));
    }

    /** A tablet held upright. */
    static Tab tablet(RunningServer server, Browser browser) {
        return new Tab(server, browser, new Browser.NewContextOptions().setViewportSize(820, 1180), true);
    }

    /** A tablet whose browser runs no script. */
    static Tab withoutScript(RunningServer server, Browser browser) {
        return new Tab(
                server,
                browser,
                new Browser.NewContextOptions().setViewportSize(820, 1180).setJavaScriptEnabled(false),
                true);
    }

    /** A desk with keyboard and mouse. */
    static Tab desk(RunningServer server, Browser browser) {
        return new Tab(server, browser, new Browser.NewContextOptions().setViewportSize(1280, 900), false);
    }

    /** Signs in without typing. */
    Tab as(Session session) {
        context.addCookies(List.of(new Cookie("treadwarm-session", session.token()).setUrl(server.origin())));
        return this;
    }

    Page page() {
        return page;
    }

    /** Opens a page, and waits for it where it must be computed first. */
    Tab open(String path) {
        ask(path);
        awaitComputed();
        return this;
    }

    /** Opens a page, be it one that tells how far a computation is. */
    void ask(String path) {
        page.navigate(path);
    }

    private void awaitComputed() {
        page.waitForURL(
                url -> !url.contains("/computations/"), new Page.WaitForURLOptions().setTimeout(LONGEST_COMPUTATION));
    }

    /** Waits until the page tells of no computation any more. */
    void awaitDone() {
        page.waitForCondition(
                () -> page.locator("progress").count() == 0,
                new Page.WaitForConditionOptions().setTimeout(LONGEST_COMPUTATION));
    }

    /** The control at an address of the document. */
    Locator field(String pointer) {
        return page.locator("[name='" + pointer + "']");
    }

    /** The button that does this; of two, the one that is for pressing. */
    Locator button(String action) {
        return page.locator("button[name=do][value='" + action + "']").last();
    }

    void type(String pointer, String text) {
        field(pointer).fill(text);
    }

    void choose(String pointer, String option) {
        field(pointer).selectOption(option);
    }

    /** Taps or clicks, and waits for the page that it leads to, be it one that tells how far a computation is. */
    void pressOnce(Locator button) {
        page.waitForNavigation(() -> {
            if (touch) {
                button.tap();
            } else {
                button.click();
            }
        });
    }

    /** Presses, and waits for the page where it must be computed first. */
    void press(Locator button) {
        pressOnce(button);
        awaitComputed();
    }

    /** What went wrong in the tab: messages of errors and warnings, faults of scripts, requests without an answer. */
    List<String> complaints() {
        return complaints;
    }

    @Override
    public void close() {
        context.close();
    }
}
