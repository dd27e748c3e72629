package org.seepledger.cli;

import java.io.ByteArrayOutputStream;
import java.io.PrintStream;
import java.nio.charset.StandardCharsets;

/** What a command came to: its exit status and what it printed. */
record Ran(int status, String out, String err) {

    static Ran of(String... arguments) {
        return of(new Interrupt(), arguments);
    }

    static Ran of(Interrupt interrupt, String... arguments) {
        ByteArrayOutputStream out = new ByteArrayOutputStream();
        ByteArrayOutputStream err = new ByteArrayOutputStream();
        int status = Seepledger.run(
                new PrintStream(out, true, StandardCharsets.UTF_8),
                new PrintStream(err, true, StandardCharsets.UTF_8),
                interrupt,
                arguments);
        return new Ran(status, out.toString(StandardCharsets.UTF_8), err.toString(StandardCharsets.UTF_8));
    }
}
