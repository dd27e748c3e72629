package org.seepledger.io.table;

import static org.assertj.core.api.Assertions.assertThat;
import static org.seepledger.io.table.Tables.assertFault;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.seepledger.ledger.NamedPeriod;

class PeriodsTableTest {

    private final List<String> warnings = new ArrayList<>();

    @TempDir
    private Path folder;

    private List<NamedPeriod> read(String text) {
        return PeriodsTable.read(Tables.file(folder, text.replace('@', '\n')), "p.csv", Tables.DATED, warnings::add);
    }

    @Test
    void readsTimesAndDates() {
        assertThat(read("name;from;to@dry spell;-5;30,5@autumn;2021-10-01;2021-12-01@late;2021-12-01;@early;;10@"))
                .containsExactly(
                        new NamedPeriod("dry spell", -5, 30.5),
                        new NamedPeriod("autumn", 0, 61),
                        new NamedPeriod("late", 61, 92),
                        new NamedPeriod("early", 0, 10));
        assertThat(warnings).isEmpty();
    }

    @Test
    void warnsOfAPeriodThatEndsADayEarly() {
        assertThat(read("name,from,to@October,2021-10-01,2021-10-31@"))
                .containsExactly(new NamedPeriod("October", 0, 30));
        assertThat(warnings).singleElement().asString().startsWith("p.csv, line 2: \"to\" is 2021-10-31");
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "name,from,to@a,0,1@b,1,2@a,2,3 | line 4, column \"name\": found the name \"a\" again; expected names that",
                "name,from,to@,0,1 | line 2, column \"name\": found an empty cell; expected a name",
                "name,from,to@a,5,5 | line 2: found from \"5\" to \"5\"; expected an end after the beginning",
                "name,from,to@a,92,100 | line 2: found a period outside the record, from 92.0 to 100.0; expected one that "
                        + "overlaps it, from 0.0 to 92.0 d",
                "name,from,to@a,-2,0 | line 2: found a period outside the record",
                "name,from,to@a,95, | line 2: found a period outside the record",
                "name,from,to@a,,-1 | line 2: found a period outside the record",
                "name,from@a,1 | line 1: found no column \"to\"",
                "name,from,to@a,x,1 | line 2, column \"from\": found \"x\"; expected a time or an ISO date",
                "name,from,to@ | line 1: found no period; expected at least one line",
            })
    void saysWhatIsWrongAndWhere(String text, String message) {
        assertFault(() -> read(text)).startsWith("p.csv, " + message);
    }
}
