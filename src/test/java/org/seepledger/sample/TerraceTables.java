package org.seepledger.sample;

/** The CSV files of the terrace. */
final class TerraceTables {

    private final Terrace terrace;
    private final BlockGrid grid;

    TerraceTables(Terrace terrace) {
        this.terrace = terrace;
        this.grid = terrace.problem().grid();
    }

    String layers() {
        StringBuilder table = table("layer surfaces", "row,col,ground [m],gravel_base [m],silt_base [m],sand_base [m]");
        for (int cell = 0; cell < grid.cellsInLayer(); cell++) {
            rowAndColumn(table, cell).append(',').append(Digits.decimals(grid.topElevation(cell), 2));
            for (int below = cell; below < grid.cells(); below += grid.cellsInLayer()) {
                table.append(',').append(Digits.decimals(grid.bottomElevation(below), 2));
            }
            table.append('\n');
        }
        return table.toString();
    }

    String flux() {
        CentreDischarge discharge = CentreDischarge.of(grid, terrace.solution());
        StringBuilder table = table(
                "specific discharge at the cells' centres, along the grid's own axes",
                "row,col,layer,qx [m/d],qy [m/d],qz [m/d]");
        for (int cell = 0; cell < grid.cells(); cell++) {
            if (terrace.problem().isActive(cell)) {
                rowAndColumn(table, cell).append(',').append(grid.layer(cell) + 1);
                table.append(',').append(Digits.significant(discharge.x()[cell], 5));
                table.append(',').append(Digits.significant(discharge.y()[cell], 5));
                table.append(',').append(Digits.significant(discharge.z()[cell], 5));
                table.append('\n');
            }
        }
        return table.toString();
    }

    String head() {
        StringBuilder table = table("steady heads", "row,col,layer,head [m]");
        for (int cell = 0; cell < grid.cells(); cell++) {
            if (terrace.problem().isActive(cell)) {
                rowAndColumn(table, cell).append(',').append(grid.layer(cell) + 1);
                table.append(',').append(Digits.decimals(terrace.solution().heads()[cell], 4));
                table.append('\n');
            }
        }
        return table.toString();
    }

    String recharge() {
        StringBuilder table = table("recharge; x and y are the cells' centres on the map", "x,y,recharge [mm/yr]");
        int[] recharge = terrace.recharge();
        for (int cell = 0; cell < recharge.length; cell++) {
            if (terrace.takesRecharge(cell)) {
                place(table, grid.centreX(cell), grid.centreY(cell), 3);
                table.append(',').append(recharge[cell]).append('\n');
            }
        }
        return table.toString();
    }

    String river() {
        StringBuilder table = table(
                "exchange with the river, positive where the aquifer gains; one line for each reach in a cell",
                "row,col,reach,exchange [m3/d]");
        for (River.Piece piece : terrace.river()) {
            rowAndColumn(table, piece.exchange().cell()).append(',').append(piece.reach());
            table.append(',').append(Digits.significant(terrace.exchange(piece), 6));
            table.append('\n');
        }
        return table.toString();
    }

    String wells() {
        StringBuilder table = table(
                "mean rates of the year, negative where water is taken out",
                "name,x,y,screen_top,screen_bottom,from,to,rate [m3/d],category");
        for (Well well : Terrace.WELLS) {
            table.append(well.name()).append(',');
            place(table, well.x(), well.y(), 1);
            table.append(',').append(Digits.decimals(well.screenTop(grid), 2));
            table.append(',').append(Digits.decimals(well.screenBottom(grid), 2));
            table.append(",,,").append(Digits.decimals(well.rate(), 1));
            table.append(',').append(well.category()).append('\n');
        }
        return table.toString();
    }

    private static StringBuilder table(String note, String header) {
        return new StringBuilder("# Invented river terrace: ")
                .append(note)
                .append('\n')
                .append(header)
                .append('\n');
    }

    private StringBuilder rowAndColumn(StringBuilder table, int cell) {
        return table.append(grid.row(cell) + 1).append(',').append(grid.column(cell) + 1);
    }

    private static void place(StringBuilder table, double x, double y, int decimals) {
        table.append(Digits.decimals(Terrace.FRAME.mapX(x, y), decimals));
        table.append(',').append(Digits.decimals(Terrace.FRAME.mapY(x, y), decimals));
    }
}
