package org.seepledger.cli;

import java.io.IOException;
import java.io.PrintStream;
import org.seepledger.fault.DataFault;
import org.seepledger.fault.UsageFault;
import org.seepledger.io.Unreadable;
import org.seepledger.progress.Cancelled;
import picocli.CommandLine;

/** Turns what went wrong into one line and an exit status. */
final class Faults {

    static final int PROGRAM = 1;
    static final int USAGE = 2;
    static final int DATA = 3;
    static final int CLOSURE = 4;
    static final int CANCELLED = 130;

    private static final String TRACE = "seepledger.trace";

    private Faults() {}

    static int report(Throwable fault, PrintStream err) {
        if (isOutOfMemory(fault)) {
            err.println(
                    "The memory that Java may use is full. Give it more with java -Xmx4g, or choose smaller prisms.");
            return PROGRAM;
        }
        if (Boolean.getBoolean(TRACE)) {
            fault.printStackTrace(err);
        }
        if (fault instanceof DataFault) {
            err.println(fault.getMessage());
            return DATA;
        }
        if (fault instanceof UsageFault) {
            err.println(fault.getMessage());
            return USAGE;
        }
        if (fault instanceof IOException broken) {
            err.println("A result cannot be written (" + Unreadable.reason(broken)
                    + "); nothing is left of it. Make room, or name another place.");
            return USAGE;
        }
        if (fault instanceof Cancelled) {
            err.println("Stopped; nothing was written.");
            return CANCELLED;
        }
        err.println("This is a fault of the program, not of the data: " + oneLine(fault)
                + ". Nothing was written. Run again with java -D" + TRACE + "=true to see where.");
        return PROGRAM;
    }

    static int reportUsage(CommandLine.ParameterException fault, PrintStream err) {
        String command = fault.getCommandLine().getCommandSpec().qualifiedName();
        String nearest = fault instanceof CommandLine.UnmatchedArgumentException unmatched
                ? unmatched.getSuggestions().stream()
                        .findFirst()
                        .map(name -> " Did you mean " + name + "?")
                        .orElse("")
                : "";
        err.println(oneLine(fault) + "." + nearest + " See " + command + " --help.");
        return USAGE;
    }

    private static boolean isOutOfMemory(Throwable fault) {
        return fault instanceof OutOfMemoryError || fault.getCause() != null && isOutOfMemory(fault.getCause());
    }

    private static String oneLine(Throwable fault) {
        String message = fault.getMessage() == null ? fault.getClass().getSimpleName() : fault.getMessage();
        return message.replaceAll("\\p{Cntrl}+", " ").replaceFirst("\\.$", "");
    }
}
