package org.seepledger.io.result;

/**
 * A file that a run read.
 *
 * @param name the file as the user would name it
 * @param bytes its size
 * @param sha256 its SHA-256, in hexadecimal
 */
public record Input(String name, long bytes, String sha256) {}
