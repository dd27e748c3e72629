package org.seepledger.cli;

import java.io.Console;
import java.io.PrintStream;
import java.io.PrintWriter;
import java.nio.charset.Charset;
import java.nio.charset.StandardCharsets;
import java.time.Clock;
import java.util.Locale;
import java.util.logging.Level;
import java.util.logging.Logger;
import org.seepledger.job.Version;
import picocli.CommandLine;
import picocli.CommandLine.Command;
import picocli.CommandLine.IVersionProvider;

/**
 * The command line.
 *
 * <pre>
 * seepledger inspect sample-aquifers/terrace
 * seepledger balance sample-aquifers/terrace --prisms sample-aquifers/terrace/prisms.geojson --out budget
 * </pre>
 */
@Command(
        name = "seepledger",
        description = "How much water comes into and goes out of a volume of your own choosing in a gridded aquifer,"
                + " through each face, from each source and from storage, and how well it all closes.",
        subcommands = {
            InspectCommand.class,
            BalanceCommand.class,
            TraceCommand.class,
            ExtractCommand.class,
            PlumeCommand.class,
            ReviewCommand.class,
            CompareCommand.class,
            DesktopCommand.class
        },
        mixinStandardHelpOptions = true,
        versionProvider = Seepledger.ProgramVersion.class,
        synopsisSubcommandLabel = "COMMAND",
        footer = {
            "",
            "Try it on the sample aquifer:",
            "  seepledger inspect sample-aquifers/terrace",
            "  seepledger balance sample-aquifers/terrace \\",
            "    --prisms sample-aquifers/terrace/prisms.geojson --out budget",
            "",
            "Exit status: 0 done; 1 a fault of the program; 2 the command line is wrong; 3 the data are wrong;",
            "4 done, but a closure error exceeds --max-closure-error, or a review found a fault."
        })
public final class Seepledger {

    private Seepledger() {}

    /** Prints the version. */
    static final class ProgramVersion implements IVersionProvider {

        @Override
        public String[] getVersion() {
            return new String[] {"seepledger " + Version.text()};
        }
    }

    /**
     * Runs one command and exits with its status.
     *
     * @param arguments the command and its options
     */
    public static void main(String[] arguments) {
        Locale.setDefault(Locale.ROOT);
        Logger.getLogger("").setLevel(Level.SEVERE);
        Console console = System.console();
        Charset charset = console == null ? StandardCharsets.UTF_8 : console.charset();
        Interrupt interrupt = new Interrupt();
        Runtime.getRuntime().addShutdownHook(new Thread(interrupt::stopAndWait, "interrupt"));
        int status = run(
                new PrintStream(System.out, true, charset),
                new PrintStream(System.err, true, charset),
                interrupt,
                Clock.systemDefaultZone(),
                arguments);
        interrupt.finished();
        System.exit(status);
    }

    /**
     * Runs one command.
     *
     * @param out where results are printed
     * @param err where progress and faults are printed
     * @param interrupt told when the user wants the work to stop
     * @param clock what tells the date
     * @param arguments the command and its options
     * @return the exit status
     */
    static int run(PrintStream out, PrintStream err, Interrupt interrupt, Clock clock, String... arguments) {
        Terminal terminal = new Terminal(out, err, interrupt, System.console() != null, clock);
        CommandLine line = new CommandLine(new Seepledger(), new CommandLine.IFactory() {
            @Override
            public <K> K create(Class<K> type) throws Exception {
                if (type == InspectCommand.class) {
                    return type.cast(new InspectCommand(terminal));
                }
                if (type == BalanceCommand.class) {
                    return type.cast(new BalanceCommand(terminal));
                }
                if (type == TraceCommand.class) {
                    return type.cast(new TraceCommand(terminal));
                }
                if (type == PlumeCommand.class) {
                    return type.cast(new PlumeCommand(terminal));
                }
                if (type == ReviewCommand.class) {
                    return type.cast(new ReviewCommand(terminal));
                }
                if (type == CompareCommand.class) {
                    return type.cast(new CompareCommand(terminal));
                }
                if (type == ExtractCommand.class) {
                    return type.cast(new ExtractCommand(terminal));
                }
                return CommandLine.defaultFactory().create(type);
            }
        });
        line.setOut(new PrintWriter(out, true));
        line.setErr(new PrintWriter(err, true));
        line.setCaseInsensitiveEnumValuesAllowed(true);
        line.setUsageHelpWidth(100);
        line.setExecutionExceptionHandler((fault, command, parsed) -> Faults.report(fault, err));
        line.setParameterExceptionHandler((fault, given) -> Faults.reportUsage(fault, err));
        if (arguments.length == 0) {
            line.usage(out);
            return 2;
        }
        try {
            return line.execute(arguments);
        } catch (Error e) {
            return Faults.report(e, err);
        }
    }
}
