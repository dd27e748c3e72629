package org.seepledger.sample;

import java.time.LocalDate;

/** The CSV files of the valley. */
final class ValleyTables {

    /** So many digits that a double reads back to itself (IEEE 754). */
    private static final int ALL_DIGITS = 17;

    private final Valley valley;

    ValleyTables(Valley valley) {
        this.valley = valley;
    }

    /** What the river gives and takes, with all digits: these are the very rates that the heads were found with. */
    String river() {
        BlockGrid grid = valley.grid();
        StringBuilder table = new StringBuilder("""
                # Invented valley: exchange with the river, positive where the aquifer gains; interval 1 is October 2021
                row,col,interval,reach,exchange [m3/d]
                """);
        for (int interval = 0; interval < ValleySeasons.MONTHS; interval++) {
            for (River.Piece piece : valley.river()) {
                int cell = piece.exchange().cell();
                table.append(grid.row(cell) + 1).append(',').append(grid.column(cell) + 1);
                table.append(',').append(interval + 1).append(',').append(piece.reach());
                table.append(',').append(Digits.significant(valley.exchange(piece, interval), ALL_DIGITS));
                table.append('\n');
            }
        }
        return table.toString();
    }

    static String wells() {
        StringBuilder table = new StringBuilder("""
                # Invented valley: wells, negative where water is taken out; a date is 00:00 of its day
                name,category,x,y,screen_top,screen_bottom,from,to,rate [m3/d],volume [m3]
                """);
        for (PumpedWell well : Valley.WELLS) {
            well.schedule().forEach(line -> append(table, well, line));
        }
        return table.toString();
    }

    private static void append(StringBuilder table, PumpedWell well, PumpedWell.Line line) {
        String amount = Digits.decimals(line.amount(), 0);
        table.append(well.name()).append(',').append(well.category());
        table.append(',').append(Digits.decimals(Valley.FRAME.mapX(well.x(), well.y()), 1));
        table.append(',').append(Digits.decimals(Valley.FRAME.mapY(well.x(), well.y()), 1));
        table.append(',').append(Digits.decimals(well.screenTop(), 1));
        table.append(',').append(Digits.decimals(well.screenBottom(), 1));
        table.append(',').append(line.from().map(LocalDate::toString).orElse(""));
        table.append(',').append(line.to().map(LocalDate::toString).orElse(""));
        table.append(',').append(line.isVolume() ? "," + amount : amount + ",").append('\n');
    }
}
