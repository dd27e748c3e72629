package org.seepledger.desktop.action;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.Test;

class ActionsTest {

    private final List<String> done = new ArrayList<>();
    private final Actions actions = new Actions();

    private Action action(String name, String keys, boolean possible) {
        return new Action("actions.group.window", name, keys, () -> possible, () -> done.add(name));
    }

    @Test
    void actionsAreFoundByPartsOfTheirWords() {
        actions.add(List.of(action("action.open", "F2", true), action("action.theme", "F3", true)));
        assertThat(actions.matching("")).hasSize(2);
        assertThat(actions.matching(" FOLDER wind")).extracting(Action::name).containsExactly("action.open");
        assertThat(actions.matching("no such")).isEmpty();
    }

    @Test
    void twoActionsCannotShareAShortcut() {
        actions.add(List.of(action("action.open", "F2", true)));
        assertThatThrownBy(() -> actions.add(List.of(action("action.theme", "F2", true))))
                .hasMessageContaining("F2");
    }

    @Test
    void whatIsNotPossibleIsNotDone() {
        action("action.open", "F2", false).perform();
        action("action.theme", "F3", true).perform();
        assertThat(done).containsExactly("action.theme");
    }
}
