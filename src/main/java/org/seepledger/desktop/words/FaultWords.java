package org.seepledger.desktop.words;

import org.seepledger.fault.DataFault;
import org.seepledger.fault.UsageFault;
import org.seepledger.progress.Cancelled;

/** What went wrong, as a sentence. */
public final class FaultWords {

    private FaultWords() {}

    /**
     * {@return a sentence for the person at the window}
     *
     * @param fault what went wrong
     */
    public static String of(Throwable fault) {
        if (fault instanceof DataFault || fault instanceof UsageFault) {
            return fault.getMessage();
        }
        if (fault instanceof Cancelled) {
            return Words.of("fault.stopped");
        }
        if (fault instanceof OutOfMemoryError) {
            return Words.of("fault.memory");
        }
        if (fault instanceof java.io.IOException) {
            return Words.of("fault.file", oneLine(fault));
        }
        return Words.of("fault.program", oneLine(fault));
    }

    private static String oneLine(Throwable fault) {
        String message = fault.getMessage() == null ? fault.getClass().getSimpleName() : fault.getMessage();
        return message.replaceAll("\\p{Cntrl}+", " ").replaceFirst("\\.$", "");
    }
}
