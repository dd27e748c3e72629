package org.seepledger.review.mapping;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.seepledger.ledger.Group;
import org.seepledger.review.mapping.Catalogue.Known;
import org.seepledger.review.mapping.Catalogue.Nature;

/** Terms as the trade names them. */
class TermWordsTest {

    private static final Catalogue OURS = new Catalogue(
            List.of("meadow"),
            List.of(
                    new Known(Group.SIDE, "river side", Nature.FACE),
                    new Known(Group.SIDE, "side 2", Nature.FACE),
                    new Known(Group.LID, "top", Nature.FACE),
                    new Known(Group.LID, "bottom", Nature.FACE),
                    new Known(Group.SOURCE, "recharge", Nature.AREAL),
                    new Known(Group.SOURCE, "public supply", Nature.WELLS),
                    new Known(Group.SOURCE, "orchards", Nature.WELLS),
                    new Known(Group.SOURCE, "river exchange", Nature.CELLS)));

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "Outflow through river side|item|side/river side|out",
                "Lateral inflow|item|side|in",
                "Net lateral flow (ML)|item|side|net",
                "Leakage from the underlying aquifer|item|lid/bottom|in",
                "Recharge from rainfall|item|source/recharge|in",
                "Groundwater pumping|item|source/orchards source/public supply|out",
                "Public supply|item|source/public supply|out",
                "Stream leakage|item|source/river exchange|",
                "Release from storage|item|storage|in",
                "Water-table storage uptake|item|storage/water-table storage|out",
                "Change in groundwater storage|change||",
                "Total inflow|total in||",
                "Total outflows|total out||",
                "Inflow - outflow|net total||",
                "Residual|residual||",
                "Discrepancy (%)|percent||",
                "Storage at start|opening||",
                "Precipitation|outside||",
                "Surface runoff|outside||",
                "Evapotranspiration|outside||",
                "Sundry|untied||"
            })
    void tiesThem(String label, String kind, String items, String sense) {
        Tie tie = new TermWords(OURS).of(label, "");
        assertThat(tie.kind()).hasToString(kind);
        List<String> tied = tie.items().stream().sorted().toList();
        assertThat(String.join(" ", tied)).isEqualTo(items == null ? "" : items);
        assertThat(tie.sense().map(Sense::toString).orElse(null)).isEqualTo(sense);
    }
}
