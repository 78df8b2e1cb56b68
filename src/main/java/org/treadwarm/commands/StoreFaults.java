package org.treadwarm.commands;

import org.treadwarm.store.StoreUnavailable;
import picocli.CommandLine;
import picocli.CommandLine.IExecutionExceptionHandler;
import picocli.CommandLine.ParseResult;

/** Tells in one line why the data cannot be used; exit status 1. Other faults are the program's and keep their trace. */
public final class StoreFaults implements IExecutionExceptionHandler {
    @Override
    public int handleExecutionException(Exception fault, CommandLine command, ParseResult parsed) throws Exception {
        if (fault instanceof StoreUnavailable unavailable) {
            System.err.println(unavailable.getMessage().replaceAll("\\s+", " "));
            return 1;
        }
        throw fault;
    }
}
