package org.seepledger.io.table;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.LocalDateTime;
import java.util.Optional;
import org.assertj.core.api.AbstractStringAssert;
import org.assertj.core.api.Assertions;
import org.seepledger.aquifer.Axis;
import org.seepledger.aquifer.Grid;
import org.seepledger.aquifer.GriddedValues;
import org.seepledger.aquifer.Times;
import org.seepledger.fault.DataFault;
import org.seepledger.unit.Measure;

/** Small invented tables and the frames that they are read in. */
final class Tables {

    static final Measure DAY = Measure.of("d");
    static final Measure METRE = Measure.of("m");
    static final Measure CUBIC_METRE_A_DAY = Measure.of("m3/d");
    static final Times TIMES = new Times(new double[] {0, 30, 61, 92}, DAY, Optional.empty());
    static final Times DATED =
            new Times(new double[] {0, 31, 61, 92}, DAY, Optional.of(LocalDateTime.of(2021, 10, 1, 0, 0)));

    /** Two rows and three columns of 10 by 20, the corner at 100, 200; centres x 105 115 125, y 230 (row 1) 210. */
    static final Grid GRID = new Grid(Axis.even(100, 10, 3), Axis.even(200, 20, 2), 0, 1);

    static final Frame FRAME = new Frame(GRID, 2, TIMES);

    private Tables() {}

    static Path file(Path folder, String text) {
        return file(folder, text.getBytes(StandardCharsets.UTF_8));
    }

    static Path file(Path folder, byte[] bytes) {
        try {
            return Files.write(folder.resolve("t.csv"), bytes);
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    static double[] plane(GriddedValues values, Frame frame, int layer, int step) {
        double[] plane = new double[frame.grid().window().size()];
        values.read(layer, step, frame.grid().window(), plane, 0);
        return plane;
    }

    static AbstractStringAssert<?> assertFault(org.assertj.core.api.ThrowableAssert.ThrowingCallable call) {
        Throwable thrown = Assertions.catchThrowable(call);
        Assertions.assertThat(thrown).isInstanceOf(DataFault.class);
        return Assertions.assertThat(thrown.getMessage());
    }
}
