package org.treadwarm.commands;

import ch.qos.logback.classic.Level;
import ch.qos.logback.classic.Logger;
import ch.qos.logback.classic.LoggerContext;
import ch.qos.logback.classic.encoder.JsonEncoder;
import ch.qos.logback.classic.encoder.PatternLayoutEncoder;
import ch.qos.logback.classic.spi.Configurator;
import ch.qos.logback.classic.spi.ConfiguratorRank;
import ch.qos.logback.classic.spi.ILoggingEvent;
import ch.qos.logback.core.Appender;
import ch.qos.logback.core.ConsoleAppender;
import ch.qos.logback.core.filter.Filter;
import ch.qos.logback.core.spi.ContextAwareBase;
import ch.qos.logback.core.spi.FilterReply;
import org.slf4j.LoggerFactory;

/**
 * What is logged, and how: warnings and faults, one line each, on the error stream.
 *
 * <p>The logging library finds this class as a service. A configuration file would mean the same, but reading one loads
 * an XML parser and some 300 classes at every start.
 */
@ConfiguratorRank(ConfiguratorRank.CUSTOM_HIGH_PRIORITY)
public final class LogSetup extends ContextAwareBase implements Configurator {
    private static final String LINE =
            "%d{yyyy-MM-dd'T'HH:mm:ss.SSSX, UTC} %-5level %logger{20} %X{request:--} %msg%n%xThrowable{20}";

    @Override
    public ExecutionStatus configure(LoggerContext context) {
        PatternLayoutEncoder encoder = new PatternLayoutEncoder();
        encoder.setContext(context);
        encoder.setPattern(LINE);
        encoder.start();
        ConsoleAppender<ILoggingEvent> console = new ConsoleAppender<>();
        console.setContext(context);
        console.setTarget("System.err");
        console.setEncoder(encoder);
        console.addFilter(new ToldOtherwise());
        console.start();
        Logger root = context.getLogger(org.slf4j.Logger.ROOT_LOGGER_NAME);
        root.setLevel(Level.WARN);
        root.addAppender(console);
        // It warns, with a trace, of every connection that breaks; the store says the same in a line.
        context.getLogger("com.zaxxer.hikari").setLevel(Level.ERROR);
        // It warns of every client that sends an odd Host header; the host guard answers those.
        context.getLogger("org.eclipse.jetty.util.HostPort").setLevel(Level.ERROR);
        return ExecutionStatus.DO_NOT_INVOKE_NEXT_IF_ANY;
    }

    /** From now on, writes each event as a JSON object in a line of its own, and one for each request too. */
    static void writeJson() {
        LoggerContext context = (LoggerContext) LoggerFactory.getILoggerFactory();
        JsonEncoder encoder = new JsonEncoder();
        encoder.setContext(context);
        encoder.setWithSequenceNumber(false);
        encoder.setWithNanoseconds(false);
        encoder.setWithContext(false);
        encoder.setWithMessage(false);
        encoder.setWithArguments(false);
        encoder.setWithFormattedMessage(true);
        encoder.start();
        context.getLogger(org.slf4j.Logger.ROOT_LOGGER_NAME)
                .iteratorForAppenders()
                .forEachRemaining(appender -> write(appender, encoder));
        context.getLogger("org.treadwarm.requests").setLevel(Level.INFO);
    }

    private static void write(Appender<ILoggingEvent> appender, JsonEncoder encoder) {
        if (appender instanceof ConsoleAppender<ILoggingEvent> console) {
            console.setEncoder(encoder);
        }
    }

    /** The command that serves says itself, in words, why the server did not start. */
    private static final class ToldOtherwise extends Filter<ILoggingEvent> {
        @Override
        public FilterReply decide(ILoggingEvent event) {
            return event.getMessage().equals("Failed to start Javalin") ? FilterReply.DENY : FilterReply.NEUTRAL;
        }
    }
}
