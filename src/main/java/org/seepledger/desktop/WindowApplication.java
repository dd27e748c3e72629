package org.seepledger.desktop;

import java.nio.file.Path;
import java.util.prefs.Preferences;
import javafx.application.Application;
import javafx.application.Platform;
import javafx.scene.image.Image;
import javafx.stage.Stage;
import org.seepledger.desktop.platform.HostOpener;
import org.seepledger.desktop.platform.PreferredFolders;
import org.seepledger.desktop.platform.PreferredSettings;
import org.seepledger.desktop.platform.ScreenCopyBoard;
import org.seepledger.desktop.platform.ScreenDialogs;
import org.seepledger.desktop.platform.ScreenQuestions;
import org.seepledger.desktop.platform.WindowPlace;
import org.seepledger.desktop.port.Settings;
import org.seepledger.desktop.task.BackgroundTasks;
import org.seepledger.desktop.task.Tasks;
import org.seepledger.desktop.welcome.Samples;
import org.seepledger.desktop.words.Words;

/** The program as the toolkit starts it; its one argument, if given, is the folder to open. */
public final class WindowApplication extends Application {

    private static final double LEAST_WIDTH = 900;
    private static final double LEAST_HEIGHT = 600;

    private final Tasks tasks = new BackgroundTasks(Platform::runLater);

    /** Made by the toolkit. */
    public WindowApplication() {}

    @Override
    public void start(Stage stage) {
        Preferences kept = Preferences.userRoot().node("org/seepledger/desktop");
        Settings settings = new PreferredSettings(kept);
        Assembly assembly = new Assembly(
                new Assembly.Outside(
                        tasks,
                        new ScreenDialogs(stage, settings),
                        new ScreenQuestions(stage),
                        new ScreenCopyBoard(),
                        new PreferredFolders(kept),
                        settings,
                        new HostOpener(getHostServices())),
                Samples.usualPlaces());
        stage.getIcons().add(new Image(WindowApplication.class.getResourceAsStream("icon.png")));
        stage.setTitle(Words.of("program"));
        stage.setMinWidth(LEAST_WIDTH);
        stage.setMinHeight(LEAST_HEIGHT);
        stage.setScene(assembly.scene());
        new WindowPlace(settings).follow(stage);
        stage.setOnCloseRequest(request -> {
            request.consume();
            assembly.files().whenSafe(stage::hide);
        });
        getParameters().getRaw().stream().findFirst().map(Path::of).ifPresent(assembly.welcome()::open);
        stage.show();
    }

    @Override
    public void stop() {
        tasks.close();
    }
}
