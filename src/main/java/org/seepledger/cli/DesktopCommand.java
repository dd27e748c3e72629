package org.seepledger.cli;

import java.nio.file.Path;
import java.util.Optional;
import java.util.concurrent.Callable;
import org.seepledger.desktop.Desktop;
import picocli.CommandLine.Command;
import picocli.CommandLine.Parameters;

/** {@code seepledger desktop}. */
@Command(
        name = "desktop",
        description = "Opens a window with a map: draw prisms on it and watch their budgets follow.",
        mixinStandardHelpOptions = true,
        footer = {"", "Example:", "  seepledger desktop sample-aquifers/valley"})
final class DesktopCommand implements Callable<Integer> {

    @Parameters(
            paramLabel = "AQUIFER",
            arity = "0..1",
            description = "The folder with aquifer.json (default: begin with the welcome page).")
    private Optional<Path> aquifer = Optional.empty();

    @Override
    public Integer call() {
        Desktop.open(aquifer);
        return 0;
    }
}
