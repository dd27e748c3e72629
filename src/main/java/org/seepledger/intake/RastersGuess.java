package org.seepledger.intake;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import java.util.stream.Collectors;
import org.seepledger.intake.LooseFile.BandLook;

/** Guesses what rasters with names of one pattern are. */
final class RastersGuess {

    private final List<LooseFile.Raster> files;
    private final List<NamePattern> names;

    private RastersGuess(List<LooseFile.Raster> files) {
        this.files = files;
        this.names =
                files.stream().map(file -> NamePattern.of(file.shownName())).toList();
    }

    static Item.Rasters of(List<LooseFile.Raster> files) {
        return new RastersGuess(files).item();
    }

    private Item.Rasters item() {
        NamePattern first = names.get(0);
        String id = files.size() == 1 ? files.get(0).shownName() : marked(first);
        List<Means> fields = first.fields().stream().map(field -> Means.NOTHING).toList();
        List<Use> uses = bandUses();
        if (uses.isEmpty()) {
            uses = whole(id);
        }
        return new Item.Rasters(id, files, names, fields, Means.NOTHING, uses);
    }

    /** The name, with what all files share in the fields that do not differ. */
    private String marked(NamePattern first) {
        List<String> texts = new ArrayList<>();
        for (int field = 0; field < first.fields().size(); field++) {
            texts.add(
                    distinct(names, field).size() == 1
                            ? first.fields().get(field).text()
                            : "#");
        }
        return first.with(texts);
    }

    /** {@return the different texts of a field} */
    static Set<String> distinct(List<NamePattern> names, int field) {
        return names.stream().map(name -> name.fields().get(field).text()).collect(Collectors.toSet());
    }

    /** Where descriptions say that bands are different things, each is used by itself. */
    private List<Use> bandUses() {
        List<BandLook> bands = files.get(0).bands();
        List<Use> uses = new ArrayList<>();
        for (int band = 0; band < bands.size(); band++) {
            BandLook look = bands.get(band);
            if (Vocabulary.of(look.description()).isPresent()) {
                uses.add(use(band, look.description(), look.description(), look.least(), look.greatest()));
            }
        }
        long roles = uses.stream().map(Use::role).distinct().count();
        boolean surfaces = uses.stream().allMatch(use -> use.role().isSurface());
        return uses.size() == bands.size() && bands.size() > 1 && (roles > 1 || surfaces) ? uses : List.of();
    }

    /** Where a raster speaks of surfaces, each of its bands is one. */
    private List<Use> whole(String id) {
        List<BandLook> bands = files.get(0).bands();
        Use all = all(id);
        if (files.size() > 1 || bands.size() == 1 || !all.role().isSurface() || !Vocabulary.saysSurfaces(id)) {
            return List.of(all);
        }
        List<Use> uses = new ArrayList<>();
        for (int band = 0; band < bands.size(); band++) {
            BandLook look = bands.get(band);
            uses.add(use(band, String.valueOf(band + 1), stem(id), look.least(), look.greatest()));
        }
        return uses;
    }

    private Use all(String id) {
        double least = Double.NaN;
        double greatest = Double.NaN;
        for (LooseFile.Raster file : files) {
            for (BandLook band : file.bands()) {
                least = band.least() >= least ? least : band.least();
                greatest = band.greatest() <= greatest ? greatest : band.greatest();
            }
        }
        BandLook first = files.get(0).bands().get(0);
        String text = stem(id);
        boolean telling = Vocabulary.of(text).isEmpty();
        return use(-1, "", telling ? text + " " + first.description() : text, least, greatest);
    }

    private static String stem(String id) {
        int dot = id.lastIndexOf('.');
        return dot > id.lastIndexOf('/') ? id.substring(0, dot) : id;
    }

    private static Use use(int band, String part, String text, double least, double greatest) {
        Guess guess = RoleGuess.of(text, least, greatest);
        String last = text.substring(text.lastIndexOf('/') + 1);
        return UseGuess.of(band, part, last, guess, least, greatest, Optional.empty());
    }
}
