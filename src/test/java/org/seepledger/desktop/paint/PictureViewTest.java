package org.seepledger.desktop.paint;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import java.util.Optional;
import java.util.concurrent.TimeoutException;
import javafx.beans.property.SimpleObjectProperty;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import org.seepledger.desktop.theme.Theme;
import org.seepledger.picture.Picture;
import org.testfx.api.FxRobot;
import org.testfx.api.FxToolkit;

class PictureViewTest {

    private static final double NEEDED = 100;

    @BeforeAll
    static void start() throws TimeoutException {
        FxToolkit.registerPrimaryStage();
    }

    private static Picture picture(double width, double height) {
        return new Picture(width, height, "", "", List.of());
    }

    private static double leastIn(PictureView view, double height) {
        new FxRobot().interact(() -> {
            view.resize(300, height);
            view.layout();
        });
        return view.getMinHeight();
    }

    @Test
    void aPictureThatFillsItsRoomGetsLowerWithItDownToWhatItNeeds() {
        PictureView.ForSize filling = (width, height) -> Optional.of(picture(width, Math.max(NEEDED, height)));
        PictureView view = new PictureView(filling, new SimpleObjectProperty<>(Theme.LIGHT));
        assertThat(leastIn(view, 400)).isLessThanOrEqualTo(0);
        assertThat(leastIn(view, 50)).isEqualTo(NEEDED);
        assertThat(leastIn(view, NEEDED)).isEqualTo(NEEDED);
        assertThat(leastIn(view, 200)).isLessThanOrEqualTo(0);
    }

    @Test
    void anotherPictureMayNeedLess() {
        double[] needed = {NEEDED};
        PictureView.ForSize filling = (width, height) -> Optional.of(picture(width, Math.max(needed[0], height)));
        PictureView view = new PictureView(filling, new SimpleObjectProperty<>(Theme.LIGHT));
        assertThat(leastIn(view, 50)).isEqualTo(NEEDED);
        needed[0] = 30;
        new FxRobot().interact(view::redraw);
        assertThat(leastIn(view, 50)).isLessThanOrEqualTo(0);
    }

    @Test
    void aPictureOfItsOwnHeightKeepsIt() {
        PictureView view =
                new PictureView(width -> Optional.of(picture(width, 250)), new SimpleObjectProperty<>(Theme.LIGHT));
        assertThat(leastIn(view, 400)).isEqualTo(250);
    }
}
