package org.seepledger.job;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.seepledger.review.check.Code;
import org.seepledger.review.check.Finding;
import org.seepledger.review.check.Review;
import org.seepledger.review.check.Severity;

/** Tables that are looked at by themselves. */
class LoneTablesTest {

    private static final String SOUND = """
            Budget of the meadow, all figures in ML

            Component;2020-01;2020-02;2020-03;Total
            Inflows
            Lateral flow;10.0;11.0;12.0;33.0
            Recharge;5.0;4.0;3.0;12.0
            Total inflow;15.0;15.0;15.0;45.0
            Outflows
            Pumping;12.0;13.0;14.0;39.0
            Total outflow;12.0;13.0;14.0;39.0
            Balance
            Change in storage;2.9;2.1;0.9;5.9
            Residual;0.1;-0.1;0.1;0.1
            Closure error (%);0.7;-0.7;0.7;0.2
            """;

    @TempDir
    private Path folder;

    private List<Finding> review(String text) throws IOException {
        Path file = folder.resolve("submitted.csv");
        Files.writeString(file, text);
        return Review.of(Reading.of(file, Optional.empty(), Optional.empty(), 10), Optional.empty(), 1)
                .findings();
    }

    private static List<Code> codes(List<Finding> findings) {
        return findings.stream()
                .filter(one -> one.severity() != Severity.NOTE)
                .map(Finding::code)
                .toList();
    }

    @Test
    void aSoundOneHasNoFaultAndNoDoubt() throws IOException {
        assertThat(codes(review(SOUND))).isEmpty();
    }

    @Test
    void rowsThatDoNotAddToTheirTotal() throws IOException {
        List<Finding> found = review(SOUND.replace("Total outflow;12.0", "Total outflow;7.0"));
        assertThat(codes(found)).contains(Code.SUM);
        assertThat(found.get(0).submitted()).isEqualTo(7.0);
        assertThat(found.get(0).recomputed()).isEqualTo(12.0);
        assertThat(found.get(0).message()).contains("line 10, column 2");
    }

    @Test
    void aTotalThatLeavesARowOutSaysWhich() throws IOException {
        List<Finding> found = review(SOUND.replace("Total inflow;15.0;15.0", "Total inflow;15.0;11.0"));
        assertThat(found.get(0).message()).contains("\"Recharge\", which may be left out");
    }

    @Test
    void aResidualThatDoesNotFollow() throws IOException {
        assertThat(codes(review(SOUND.replace("Change in storage;2.9", "Change in storage;1.2"))))
                .contains(Code.BALANCE);
    }

    @Test
    void monthsThatDoNotMakeTheWhole() throws IOException {
        assertThat(codes(review(SOUND.replace("Recharge;5.0;4.0;3.0;12.0", "Recharge;5.0;4.0;3.0;14.0"))))
                .contains(Code.PARTS);
    }

    @Test
    void aClosureErrorThatDoesNotFollow() throws IOException {
        assertThat(codes(review(SOUND.replace("(%);0.7", "(%);3.5")))).containsExactly(Code.PERCENT);
    }

    @Test
    void roundingIsNoError() throws IOException {
        assertThat(codes(review("""
                Item,2020 (ML)
                Lateral inflow,10.4
                Recharge,5.4
                Total inflow,15.9
                """))).isEmpty();
    }

    @Test
    void rateTimesDaysThatIsNotTheVolume() throws IOException {
        String table = """
                Item,Period,Rate (m3/d),Volume (m3)
                Recharge,2020-01,100,3100
                Pumping,2020-01,50,%s
                """;
        assertThat(codes(review(table.formatted("1550")))).isEmpty();
        List<Finding> found = review(table.formatted("47275"));
        assertThat(codes(found)).containsExactly(Code.RATE_VOLUME);
        assertThat(codes(review(table.formatted("1525")))).as("30.5 days").isEmpty();
    }

    @Test
    void stocksThatDoNotCarryOver() throws IOException {
        String table = """
                Item,2020 (ML),2021 (ML)
                Storage at start,100,%s
                Storage at end,110,95
                Change in storage,10,-15
                """;
        assertThat(codes(review(table.formatted("110")))).isEmpty();
        assertThat(codes(review(table.formatted("112")))).contains(Code.CARRY);
    }

    @Test
    void netThatIsNotInLessOut() throws IOException {
        String table = """
                Item,Period,Inflow (ML),Outflow (ML),Net (ML)
                Lateral flow,2020,10,4,%s
                """;
        assertThat(codes(review(table.formatted("6")))).isEmpty();
        assertThat(codes(review(table.formatted("16")))).containsExactly(Code.SUM);
    }

    @Test
    void whatCannotBeReadIsListed() throws IOException {
        List<Finding> found = review(SOUND.replace("Recharge;5.0", "Recharge;see note"));
        assertThat(found).anySatisfy(one -> {
            assertThat(one.code()).isEqualTo(Code.NOT_TIED);
            assertThat(one.message()).contains("see note", "line 6, column 2");
        });
    }

    @Test
    void closureToNothingAndAResidualOfOneSignAreNotes() throws IOException {
        String table = """
                Item,2020-01 (ML),2020-02 (ML),2020-03 (ML),2020-04 (ML)
                Lateral inflow,10,11,12,13
                Recharge,5,5,5,5
                Pumping,%s
                """;
        List<Finding> closing = review(table.formatted("15,16,17,18"));
        assertThat(closing).extracting(Finding::code).contains(Code.EXACT_CLOSURE);
        assertThat(codes(closing)).isEmpty();
        List<Finding> oneSided = review(table.formatted("13,14,15,16"));
        assertThat(oneSided).extracting(Finding::code).contains(Code.ONE_SIDED);
        assertThat(codes(oneSided)).isEmpty();
    }
}
