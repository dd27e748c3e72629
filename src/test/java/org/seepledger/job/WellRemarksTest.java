package org.seepledger.job;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.seepledger.balance.RunNotes;
import org.seepledger.balance.RunNotes.CutWell;
import org.seepledger.balance.WellRule;

class WellRemarksTest {

    private static List<String> remarks(WellRule rule, CutWell... wells) {
        RunNotes notes =
                new RunNotes(List.of(), List.of(), List.of(), List.of(wells), Map.of(), List.of(), Optional.empty(), 0);
        return new ArrayList<>(new RunWarnings(null, notes).remarks(rule));
    }

    @Test
    void aWellInACellThatSidesCutCountsInFullOrNotAtAllOrByArea() {
        CutWell inside = new CutWell("P", "W", true, true, false);
        CutWell outside = new CutWell("P", "W", false, true, false);
        assertThat(remarks(WellRule.POINT, inside, outside))
                .containsExactly(
                        "Well \"W\" stands in a cell that \"P\" cuts; it counts in full.",
                        "Well \"W\" stands in a cell that \"P\" cuts; it counts not at all.");
        assertThat(remarks(WellRule.SPREAD, inside))
                .containsExactly(
                        "Well \"W\" stands in a cell that \"P\" cuts; it counts by the share of its cell inside.");
    }

    @Test
    void whereLidsLieAtElevationsAPartOfItsCellsMayCount() {
        assertThat(remarks(WellRule.POINT, new CutWell("P", "W", true, false, true)))
                .containsExactly(
                        "Well \"W\" stands in \"P\", whose lids lie at elevations; it counts for the part of its"
                                + " screened cells' water that lies between the prism's lids.");
        assertThat(remarks(WellRule.POINT, new CutWell("P", "W", true, true, true)))
                .containsExactly(
                        "Well \"W\" stands in a cell that \"P\" cuts; it counts in full, but only for the part of its"
                                + " screened cells' water that lies between the prism's lids.");
        assertThat(remarks(WellRule.POINT, new CutWell("P", "W", false, true, true)))
                .containsExactly("Well \"W\" stands in a cell that \"P\" cuts; it counts not at all.");
    }
}
