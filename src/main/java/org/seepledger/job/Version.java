package org.seepledger.job;

import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.util.Properties;

/** Which version of the program this is. */
public final class Version {

    private Version() {}

    /**
     * {@return the version}
     */
    public static String text() {
        Properties properties = new Properties();
        try (InputStream resource = Version.class.getResourceAsStream("version.properties")) {
            properties.load(resource);
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
        return properties.getProperty("version");
    }
}
