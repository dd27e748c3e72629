package org.seepledger.desktop.intake;

import java.util.List;
import org.seepledger.desktop.action.Action;

/** What can be done with loose files and with a wrong description, with its keys. */
public final class IntakeActions {

    private static final String GROUP = "actions.group.intake";

    private IntakeActions() {}

    /**
     * {@return the actions}
     *
     * @param intake the loose files
     * @param mend the wrong description
     */
    public static List<Action> of(IntakeModel intake, MendModel mend) {
        return List.of(
                new Action(GROUP, "action.intake.files", "Shortcut+Shift+F", intake.shown()::get, intake::addFiles),
                new Action(GROUP, "action.intake.folder", "Shortcut+Shift+D", intake.shown()::get, intake::addFolder),
                new Action(GROUP, "action.intake.write", "Shortcut+Shift+W", intake.shown()::get, intake::write),
                new Action(GROUP, "action.intake.describe", "Shortcut+Shift+J", intake.shown()::get, intake::describe),
                new Action(GROUP, "action.mend.save", "Shortcut+Shift+M", mend::isSound, mend::save));
    }
}
