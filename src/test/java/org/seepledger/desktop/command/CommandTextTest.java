package org.seepledger.desktop.command;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.seepledger.balance.Periods;

class CommandTextTest {

    @Test
    void quotesWhatAShellWouldTakeApart() {
        CommandText command = CommandText.of("balance", "/a b/it's")
                .with("--report-title", "$x `y` \"z\" \\ * ~")
                .with("--every", CommandText.word(Periods.Every.WATER_YEAR))
                .with("--report-author", Optional.empty())
                .flag("--clip", true)
                .flag("--overwrite", false);
        assertThat(command).hasToString("""
                seepledger balance '/a b/it'\\''s' \\
                    --report-title '$x `y` "z" \\ * ~' \\
                    --every water-year \\
                    --clip""");
        assertThat(CommandText.script(List.of(CommandText.of("a", "~/b"), CommandText.of("c", "d=1"))))
                .isEqualTo("seepledger a '~/b'\nseepledger c d=1");
    }
}
