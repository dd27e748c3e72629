package org.seepledger.cli;

import java.io.ByteArrayOutputStream;
import java.io.PrintStream;
import java.nio.charset.StandardCharsets;
import java.time.Clock;
import java.time.Instant;
import java.time.ZoneOffset;

/** What a command came to: its exit status and what it printed. */
record Ran(int status, String out, String err) {

    /** The time that tests run at. */
    private static final Clock NOON = Clock.fixed(Instant.parse("2024-05-31T12:00:00Z"), ZoneOffset.UTC);

    static Ran of(String... arguments) {
        return of(new Interrupt(), arguments);
    }

    static Ran of(Interrupt interrupt, String... arguments) {
        return of(interrupt, NOON, arguments);
    }

    static Ran of(Interrupt interrupt, Clock clock, String... arguments) {
        ByteArrayOutputStream out = new ByteArrayOutputStream();
        ByteArrayOutputStream err = new ByteArrayOutputStream();
        int status = Seepledger.run(
                new PrintStream(out, true, StandardCharsets.UTF_8),
                new PrintStream(err, true, StandardCharsets.UTF_8),
                interrupt,
                clock,
                arguments);
        return new Ran(status, out.toString(StandardCharsets.UTF_8), err.toString(StandardCharsets.UTF_8));
    }
}
