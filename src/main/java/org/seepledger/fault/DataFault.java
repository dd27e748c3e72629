package org.seepledger.fault;

/**
 * The data are wrong: says in one line which file, where in it, what was found, what was expected, and the remedy.
 *
 * <p>The message reads {@code FILE, PLACE: found …; expected …. Remedy.} and never contains a line break, whatever the
 * data contain.
 */
public final class DataFault extends RuntimeException {

    private static final long serialVersionUID = 1L;

    private final String file;
    private final String place;

    /**
     * Describes one fault.
     *
     * @param file the file as the user named it, or the part of the data set
     * @param place the place in it (line and column; band, row and column; key), or an empty text
     * @param found what stands there
     * @param expected what could stand there
     * @param remedy what the user can do, as a sentence
     */
    public DataFault(String file, String place, String found, String expected, String remedy) {
        super(line(file, place, found, expected, remedy));
        this.file = file;
        this.place = place;
    }

    /** {@return the file as the user named it, or the part of the data set} */
    public String file() {
        return file;
    }

    /** {@return the place in it; empty where it is the whole} */
    public String place() {
        return place;
    }

    private static String line(String file, String place, String found, String expected, String remedy) {
        String where = place.isEmpty() ? file : file + ", " + place;
        return oneLine(where + ": found " + found + "; expected " + expected + ". " + remedy);
    }

    private static String oneLine(String text) {
        return text.replaceAll("[\\p{Cntrl}]+", " ").strip();
    }
}
