package org.seepledger.job;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.HashSet;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.Set;
import org.seepledger.picture.Picture;
import org.seepledger.picture.PrintSheet;
import org.seepledger.prism.Prism;
import org.seepledger.report.SvgWriter;
import org.seepledger.report.page.PrismPictures;

/** Writes pictures as files of their own, each with a caption that says what it is and the disclaimer. */
final class PictureFiles {

    private final OutputFolder out;
    private final HandoverRequest.Pictures wanted;
    private final PngPainter painter;
    private final List<String> caption;
    private final Set<String> taken = new HashSet<>();

    /**
     * Prepares to write.
     *
     * @param out where they go
     * @param wanted which are wanted, and as what
     * @param painter paints them
     * @param caption what is written below each after its title
     */
    PictureFiles(OutputFolder out, HandoverRequest.Pictures wanted, PngPainter painter, List<String> caption) {
        this.out = out;
        this.wanted = wanted;
        this.painter = painter;
        this.caption = caption;
    }

    /** Writes the report's pictures of prisms, those that are wanted. */
    void writeOfReport(List<Prism> prisms, List<PrismPictures> pictures) throws IOException {
        for (int i = 0; i < prisms.size(); i++) {
            String name = prisms.get(i).name();
            if (wanted.maps()) {
                write("map " + name, pictures.get(i).map());
            }
            if (wanted.sections()) {
                write("section " + name, pictures.get(i).section());
            }
        }
    }

    private void write(String name, Optional<Picture> picture) throws IOException {
        if (picture.isPresent()) {
            write(name, picture.get());
        }
    }

    /** Writes one picture. */
    void write(String name, Picture picture) throws IOException {
        Picture sheet = PrintSheet.of(picture, caption);
        String file = HandoverRequest.PICTURES + "/" + free(name);
        if (wanted.svg()) {
            Files.writeString(out.file(file + ".svg"), SvgWriter.file(sheet));
        }
        if (wanted.png()) {
            Path png = out.file(file + ".png");
            Files.write(png, painter.png(sheet));
        }
    }

    /** A name that all file systems take and no other picture has, also where case does not count. */
    private String free(String name) {
        String plain = name.replaceAll("[^\\p{L}\\p{N} _-]", "-").strip();
        String free = plain;
        for (int number = 2; !taken.add(free.toLowerCase(Locale.ROOT)); number++) {
            free = plain + " " + number;
        }
        return free;
    }
}
