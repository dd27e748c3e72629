package org.seepledger.io.submission;

import java.io.FilterInputStream;
import java.io.IOException;
import java.io.InputStream;
import java.util.zip.ZipEntry;
import java.util.zip.ZipFile;
import javax.xml.stream.XMLInputFactory;
import javax.xml.stream.XMLStreamException;
import javax.xml.stream.XMLStreamReader;
import javax.xml.stream.util.StreamReaderDelegate;
import org.seepledger.fault.DataFault;
import org.seepledger.io.Unreadable;

/**
 * The parts of a packed workbook, read as XML by streams. What a part unpacks to is counted while it is read: a small
 * file cannot unpack to a large one. Document types, and with them entities, are refused.
 */
final class PackageParts {

    private static final long MOST_UNPACKED = 256L << 20;
    private static final long MOST_TIMES = 200;
    private static final long SMALL = 1L << 20;
    private static final XMLInputFactory XML = factory();

    private final ZipFile zip;
    private final String shownFile;
    private long unpacked;

    PackageParts(ZipFile zip, String shownFile) {
        this.zip = zip;
        this.shownFile = shownFile;
    }

    private static XMLInputFactory factory() {
        XMLInputFactory factory = XMLInputFactory.newDefaultFactory();
        factory.setProperty(XMLInputFactory.SUPPORT_DTD, false);
        factory.setProperty(XMLInputFactory.IS_SUPPORTING_EXTERNAL_ENTITIES, false);
        factory.setProperty(XMLInputFactory.IS_REPLACING_ENTITY_REFERENCES, false);
        factory.setXMLResolver((publicId, systemId, base, namespace) -> InputStream.nullInputStream());
        return factory;
    }

    /** What is done with a part. */
    @FunctionalInterface
    interface Content {

        void read(XMLStreamReader xml) throws XMLStreamException;
    }

    String shownFile() {
        return shownFile;
    }

    boolean has(String part) {
        ZipEntry entry = zip.getEntry(part);
        return entry != null && !entry.isDirectory();
    }

    void read(String part, Content content) {
        ZipEntry entry = zip.getEntry(part);
        if (entry == null) {
            throw damaged(part);
        }
        try (InputStream in = new Counted(zip.getInputStream(entry), entry)) {
            XMLStreamReader xml = XML.createXMLStreamReader(in);
            content.read(new Strict(xml));
            xml.close();
        } catch (XMLStreamException e) {
            throw damaged(part);
        } catch (IOException e) {
            throw Unreadable.file(shownFile, e);
        }
    }

    /** Refuses what no workbook has. */
    private final class Strict extends StreamReaderDelegate {

        Strict(XMLStreamReader xml) {
            super(xml);
        }

        @Override
        public int next() throws XMLStreamException {
            int event = super.next();
            if (event == DTD || event == ENTITY_REFERENCE) {
                throw new DataFault(
                        shownFile,
                        "",
                        "a document type or an entity in the workbook",
                        "plain SpreadsheetML",
                        "Open it where you trust it, and save it as CSV.");
            }
            return event;
        }
    }

    private DataFault damaged(String part) {
        return new DataFault(
                shownFile,
                "part \"" + part + "\"",
                "nothing, or XML that is damaged or not allowed in a workbook",
                "plain SpreadsheetML",
                "Open and save it anew, or save it as CSV.");
    }

    /** Counts what comes out of a part. */
    private final class Counted extends FilterInputStream {

        private final long packed;
        private long own;

        Counted(InputStream in, ZipEntry entry) {
            super(in);
            this.packed = Math.max(1, entry.getCompressedSize());
        }

        @Override
        public int read() throws IOException {
            int one = super.read();
            count(one < 0 ? 0 : 1);
            return one;
        }

        @Override
        public int read(byte[] target, int offset, int length) throws IOException {
            int count = super.read(target, offset, length);
            count(Math.max(0, count));
            return count;
        }

        private void count(int bytes) {
            own += bytes;
            unpacked += bytes;
            if (unpacked > MOST_UNPACKED || own > SMALL && own > MOST_TIMES * packed) {
                throw SubmissionFile.tooMuch(
                        shownFile,
                        "",
                        "a workbook that unpacks to far more than its size",
                        MOST_TIMES + " times its size and " + (MOST_UNPACKED >> 20) + " MiB");
            }
        }
    }
}
