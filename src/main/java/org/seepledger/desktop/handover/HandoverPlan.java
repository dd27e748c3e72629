package org.seepledger.desktop.handover;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.seepledger.desktop.command.CommandText;
import org.seepledger.desktop.session.DrawnShapes;
import org.seepledger.desktop.session.OpenSet;
import org.seepledger.desktop.session.Opening;
import org.seepledger.job.BalanceRequest;
import org.seepledger.job.ExtractRequest;
import org.seepledger.job.HandoverRequest;
import org.seepledger.job.PlumeRequest;

/** What was chosen, as requests and as the commands that ask for the same. */
final class HandoverPlan {

    private final Path aquifer;
    private final Path prisms;
    private final Path out;
    private final DrawnShapes shapes;
    private final HandoverChoices chosen;

    /**
     * Makes the plan.
     *
     * @param set the open set
     * @param shapes the drawing
     * @param out the folder
     * @param chosen what is chosen
     */
    HandoverPlan(OpenSet set, DrawnShapes shapes, Path out, HandoverChoices chosen) {
        this.aquifer = set.path().toAbsolutePath().normalize();
        this.out = out;
        this.shapes = shapes;
        this.chosen = chosen;
        this.prisms = shapes.saved() ? aquifer.resolve(Opening.PRISMS) : HandoverRequest.ownPrisms(out);
    }

    HandoverRequest request() {
        return new HandoverRequest(
                shapes.drawing(),
                prisms,
                out,
                chosen.overwrite().get(),
                chosen.water().get() ? Optional.of(balance()) : Optional.empty(),
                chosen.plume().get() ? Optional.of(plume()) : Optional.empty(),
                chosen.extract().get() ? Optional.of(extract()) : Optional.empty(),
                chosen.picturesWanted());
    }

    private BalanceRequest balance() {
        BudgetChoices budget = chosen.budget();
        return new BalanceRequest(
                aquifer,
                prisms,
                out.resolve(HandoverRequest.BUDGET),
                budget.every().get(),
                budget.periods().value(),
                budget.waterYearStart().get(),
                budget.rateUnit().value(),
                budget.volumeUnit().value(),
                budget.wells().get(),
                budget.clip().get(),
                threads(),
                false,
                chosen.report().request());
    }

    private PlumeRequest plume() {
        BudgetChoices budget = chosen.budget();
        SoluteChoices solutes = chosen.solutes();
        return new PlumeRequest(
                aquifer,
                prisms,
                out.resolve(HandoverRequest.SOLUTES),
                budget.every().get(),
                budget.periods().value(),
                budget.waterYearStart().get(),
                solutes.rateUnit().value(),
                solutes.massUnit().value(),
                budget.volumeUnit().value(),
                budget.wells().get(),
                solutes.dispersion().get(),
                solutes.above().value(),
                solutes.transects().value(),
                solutes.panels().value(),
                budget.clip().get(),
                threads(),
                false,
                chosen.report().request());
    }

    private ExtractRequest extract() {
        return new ExtractRequest(
                aquifer,
                prisms,
                out.resolve(HandoverRequest.EXTRACT),
                chosen.budget().clip().get(),
                false);
    }

    /** As many as the commands take where nothing is said. */
    private static int threads() {
        return Runtime.getRuntime().availableProcessors();
    }

    List<CommandText> commands() {
        List<CommandText> commands = new ArrayList<>();
        if (chosen.water().get()) {
            CommandText balance = command("balance", HandoverRequest.BUDGET)
                    .with("--rate-unit", chosen.budget().rateUnit().value());
            commands.add(chosen.report().into(chosen.budget().into(balance)));
        }
        if (chosen.plume().get()) {
            CommandText plume = chosen.budget().into(command("plume", HandoverRequest.SOLUTES));
            commands.add(chosen.report().into(chosen.solutes().into(plume)));
        }
        if (chosen.extract().get()) {
            commands.add(command("extract", HandoverRequest.EXTRACT)
                    .flag("--clip", chosen.budget().clip().get()));
        }
        return commands.stream()
                .map(command -> command.flag("--overwrite", chosen.overwrite().get()))
                .toList();
    }

    private CommandText command(String name, String folder) {
        return CommandText.of(name, aquifer).with("--prisms", prisms).with("--out", out.resolve(folder));
    }
}
