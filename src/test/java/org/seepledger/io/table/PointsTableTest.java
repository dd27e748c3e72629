package org.seepledger.io.table;

import static org.assertj.core.api.Assertions.assertThat;
import static org.seepledger.io.table.Tables.assertFault;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.seepledger.aquifer.Axis;
import org.seepledger.aquifer.Grid;
import org.seepledger.aquifer.PointRate;
import org.seepledger.aquifer.Screen;
import org.seepledger.aquifer.Stored;
import org.seepledger.aquifer.Times;
import org.seepledger.unit.Measure;

class PointsTableTest {

    private static final double ALWAYS = Double.POSITIVE_INFINITY;
    private static final Frame DATED = new Frame(Tables.GRID, 2, Tables.DATED);

    private final List<String> warnings = new ArrayList<>();

    @TempDir
    private Path folder;

    private List<PointRate> read(String text, Frame frame) {
        Path file = Tables.file(folder, text.replace('@', '\n'));
        return PointsTable.read(
                file, "in/w.csv", "pumping", frame, Tables.METRE, Tables.CUBIC_METRE_A_DAY, warnings::add);
    }

    @Test
    void keepsTheNumberThatARateFollowsFrom() {
        String text = "name,x,y,layer,from,to,rate [L/s],volume [L]@A,105,230,1,,,-1.5,@B,105,230,1,2,6,,-4000@";
        List<PointRate> points = read(text, DATED);
        assertThat(points.get(0).given())
                .usingRecursiveComparison()
                .isEqualTo(Stored.number("in/w.csv", "line 2, column rate", -1.5, 86.4));
        assertThat(points.get(1).given())
                .usingRecursiveComparison()
                .isEqualTo(Stored.number("in/w.csv", "line 3, column volume", -4000, 0.001 / 4));
    }

    @Test
    void readsLayersScreensAndSchedules() {
        String text = "name;x;y;layer;screen_top;screen_bottom [cm];from;to;rate [L/s];category@"
                + "A;105;230;2;;;;;-1,5;@# note@A;105;230;1;;;2021-10-02;2021-11-01;-2;irrigation@"
                + "B;130;200;;12,5;1100;10;;0,5;@";
        assertThat(read(text, DATED))
                .usingRecursiveFieldByFieldElementComparatorIgnoringFields("given")
                .containsExactly(
                        new PointRate(
                                "A",
                                "pumping",
                                105,
                                230,
                                new Screen.InLayer(1),
                                -ALWAYS,
                                ALWAYS,
                                -1.5 * 86.4,
                                "in/w.csv, line 2"),
                        new PointRate(
                                "A",
                                "irrigation",
                                105,
                                230,
                                new Screen.InLayer(0),
                                1,
                                31,
                                -2 * 86.4,
                                "in/w.csv, line 4"),
                        new PointRate(
                                "B",
                                "pumping",
                                130,
                                200,
                                new Screen.Between(12.5, 11),
                                10,
                                ALWAYS,
                                0.5 * 86.4,
                                "in/w.csv, line 5"));
        assertThat(warnings).isEmpty();
    }

    @Test
    void spreadsAVolumeOverItsSpan() {
        String text = "name,x,y,layer,from,to,rate,volume [ML]@A,105,230,1,10,30,,-4@B,105,230,1,,,7,@";
        assertThat(read(text, Tables.FRAME)).extracting(PointRate::rate).containsExactly(-200.0, 7.0);
        assertThat(read("name,x,y,layer,from,to,volume@A,105,230,1,0,8,4", Tables.FRAME)
                        .get(0)
                        .rate())
                .isEqualTo(0.5);
    }

    @Test
    void needsNoLayerWhereThereIsOne() {
        Frame one = new Frame(Tables.GRID, 1, Tables.TIMES);
        assertThat(read("name,x,y,rate@A,105,230,1@", one).get(0).screen()).isEqualTo(new Screen.InLayer(0));
        assertThat(read("name,x,y,layer,rate@A,105,230,,1@", one).get(0).screen())
                .isEqualTo(new Screen.InLayer(0));
    }

    @Test
    void readsTimesOfDayAndUnitsOfTime() {
        String dated = "name,x,y,layer,from,to,rate@A,105,230,1,2021-10-01T12:00,2021-10-02T18:00:00,1";
        PointRate point = read(dated, DATED).get(0);
        assertThat(point.from()).isEqualTo(0.5);
        assertThat(point.to()).isEqualTo(1.75);
        PointRate hours = read("name,x,y,layer,from [h],to,rate@A,105,230,1,36,2,1", Tables.FRAME)
                .get(0);
        assertThat(hours.from()).isEqualTo(1.5);
        assertThat(hours.to()).isEqualTo(2);
    }

    @Test
    void ratesWithoutUnitAreInTheGivenOne() {
        Times years = new Times(new double[] {0, 1}, Measure.of("yr"), Optional.empty());
        Path file = Tables.file(folder, "name,x,y,rate\nA,105,230,2\n");
        Frame frame = new Frame(Tables.GRID, 1, years);
        List<PointRate> points =
                PointsTable.read(file, "w", "c", frame, Tables.METRE, Tables.CUBIC_METRE_A_DAY, warnings::add);
        assertThat(points.get(0).rate()).isEqualTo(2 * 365.25);
    }

    @Test
    void warnsOnceOfMonthsThatEndADayEarlyAndOfColumnsNotRead() {
        String text = "name,x,y,layer,from,to,rate,form,owner@A,105,230,1,2021-10-01,2021-10-31,1,,@"
                + "A,105,230,1,2021-11-01,2021-11-30,1,,@A,105,230,1,2021-12-01,2021-12-31T12:00,1,,@";
        read(text, DATED);
        assertThat(warnings)
                .containsExactly(
                        "in/w.csv: the columns \"form\", \"owner\" are not read.",
                        "in/w.csv, line 2: \"to\" is 2021-10-31, the last day of a month, and ends at 00:00 of that day; "
                                + "where the day itself counts, write 2021-11-01 (and 1 more such lines).");
        warnings.clear();
        read("name,x,y,layer,to,rate@A,105,230,1,2024-02-29,1@A,105,230,1,2023-02-27,1@", DATED);
        assertThat(warnings).singleElement().asString().endsWith("write 2024-03-01.");
    }

    @Test
    void placesOnATurnedGrid() {
        Grid turned = new Grid(Axis.even(100, 10, 3), Axis.even(200, 20, 2), 90, 1);
        Frame frame = new Frame(turned, 1, Tables.TIMES);
        assertThat(read("name,x,y,rate@A,61,229,1", frame)).hasSize(1);
        assertFault(() -> read("name,x,y,rate@A,105,210,1", frame)).contains("found a point outside the grid");
    }

    @Test
    void knowsTheUnitOfTheMap() {
        Grid feet = new Grid(Axis.even(100, 10, 3), Axis.even(200, 20, 2), 0, 0.3048);
        Frame frame = new Frame(feet, 1, Tables.TIMES);
        assertThat(read("name,x [ft],y [ft],rate@A,105,230,1", frame)).hasSize(1);
        assertFault(() -> read("name,x [m],y [m],rate@A,105,230,1", frame))
                .startsWith("in/w.csv, line 1, column \"x\": found coordinates in m; expected map coordinates");
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "name,x,y,layer,rate@A,131,230,1,1 | line 2: found a point outside the grid, at x 131.0, y 230.0; "
                        + "expected one on the grid, x 100.0 to 130.0 and y 200.0 to 240.0.",
                "name,x,y,layer,rate@A,,230,1,1 | line 2, column \"x\": found an empty cell; expected a number",
                "name,x,y,layer,rate@,105,230,1,1 | line 2, column \"name\": found an empty cell; expected a name",
                "name,x,y,layer,rate@A,105,230,3,1 | line 2, column \"layer\": found \"3\"; expected a whole number from 1 to 2",
                "name,x,y,layer,rate@A,105,230,,1 | line 2: found neither a layer nor a screen; expected one of them, since",
                "name,x,y,rate@A,105,230,1 | line 2: found neither a layer nor a screen",
                "name,x,y,screen_top,screen_bottom,rate@A,105,230,5,5,1 | line 2: found a screen from 5.0 up to 5.0; "
                        + "expected a screen_top above its screen_bottom",
                "name,x,y,screen_top,screen_bottom,rate@A,105,230,5,,1 | line 2: found one end of a screen; expected both",
                "name,x,y,screen_top,rate@A,105,230,5,1 | line 2: found one end of a screen; expected both",
                "name,x,y,layer,screen_top,screen_bottom,rate@A,105,230,1,5,4,1 | line 2: found a layer and a screen",
                "name,x,y,layer,rate@A,105,230,1, | line 2: found no rate; expected a rate, or a volume in its place",
                "name,x,y,layer,from,to,rate,volume@A,105,230,1,0,1,1,1 | line 2: found a rate and a volume",
                "name,x,y,layer,from,to,volume@A,105,230,1,0,,1 | line 2: found a volume without its from or to",
                "name,x,y,layer,volume@A,105,230,1,1 | line 2: found a volume without its from or to",
                "name,x,y,layer,rte@A,105,230,1,1 | line 1: found no column \"rate\" among \"name\", \"x\", \"y\", \"layer\", "
                        + "\"rte\"; expected a column of that name. The nearest is \"rte\".",
                "nam,x,y,layer,rate@A,105,230,1,1 | line 1: found no column \"name\"",
                "name,x,y,layer,rate [m/d]@A,105,230,1,1 | line 1, column \"rate\": found the unit \"m/d\"; expected a unit "
                        + "that can be given in m3/d",
                "name,x,y,layer,rate [x]@A,105,230,1,1 | line 1, column \"rate\": found the unit \"x\"; expected a known unit",
                "name,x,y,layer,from,to,rate@A,105,230,1,30,30,1 | line 2: found from \"30\" to \"30\"; expected an end after",
                "name,x,y,layer,from [yr],to [yr],rate@A,105,230,1,1e307,2e307,1 | line 2, column \"from\": found \"1e307\"; "
                        + "expected a number within the range of double precision",
                "name,x,y,layer,from,to,volume@A,105,230,1,0,1e-300,1e300 | line 2, column \"volume\": found \"1e300\"; "
                        + "expected a number within the range of double precision",
                "name,x,y,layer,from [m],rate@A,105,230,1,1,1 | line 1, column \"from\": found the unit \"m\"",
                "name,x,y,layer,from,rate@A,105,230,1,2021-10-01,1 | line 2, column \"from\": found the date \"2021-10-01\"; "
                        + "expected a time in d, since the aquifer has no dates. Give the aquifer a \"start_date\"",
                "name,x,y,layer,from,rate@A,105,230,1,1.10.2021,1 | line 2, column \"from\": found \"1.10.2021\"; expected a "
                        + "time or an ISO date. Write a time such as 30.5, or a date such as 2021-10-31",
            })
    void saysWhatIsWrongAndWhere(String text, String message) {
        assertFault(() -> read(text, Tables.FRAME)).startsWith("in/w.csv, " + message);
    }

    @ParameterizedTest
    @CsvSource({"2021-02-29", "2021-10", "2021-10-01 12:00", "2021-10-01T25:00", "2021-10-01T00:00Z", "2021-1-1"})
    void refusesWhatIsNoIsoDate(String date) {
        assertFault(() -> read("name,x,y,layer,to,rate@A,105,230,1," + date + ",1", DATED))
                .startsWith("in/w.csv, line 2, column \"to\": found \"" + date
                        + "\"; expected an ISO date that the calendar");
    }
}
