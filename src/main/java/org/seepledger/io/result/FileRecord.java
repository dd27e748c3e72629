package org.seepledger.io.result;

import java.io.IOException;
import java.io.InputStream;
import java.nio.file.Files;
import java.nio.file.Path;
import java.security.MessageDigest;
import java.security.NoSuchAlgorithmException;
import java.util.HexFormat;

/**
 * A file that a run read or wrote, and its fingerprint.
 *
 * @param name the file as the user would name it
 * @param bytes its size
 * @param sha256 its SHA-256, in hexadecimal
 */
public record FileRecord(String name, long bytes, String sha256) {

    private static final int CHUNK = 1 << 16;

    /**
     * {@return the record of a file}
     *
     * @param name the file as the user would name it
     * @param file the file
     * @throws IOException if it cannot be read
     */
    public static FileRecord of(String name, Path file) throws IOException {
        MessageDigest digest = newDigest();
        long bytes = 0;
        try (InputStream in = Files.newInputStream(file)) {
            byte[] chunk = new byte[CHUNK];
            for (int read = in.read(chunk); read >= 0; read = in.read(chunk)) {
                digest.update(chunk, 0, read);
                bytes += read;
            }
        }
        return new FileRecord(name, bytes, HexFormat.of().formatHex(digest.digest()));
    }

    private static MessageDigest newDigest() {
        try {
            return MessageDigest.getInstance("SHA-256");
        } catch (NoSuchAlgorithmException e) {
            throw new IllegalStateException(e);
        }
    }
}
