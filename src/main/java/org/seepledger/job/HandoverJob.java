package org.seepledger.job;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.LocalDate;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.seepledger.fault.UsageFault;
import org.seepledger.io.DataFolder;
import org.seepledger.io.Unreadable;
import org.seepledger.io.result.FileRecord;
import org.seepledger.io.result.Statement;
import org.seepledger.ledger.Disclaimer;
import org.seepledger.prism.Prism;
import org.seepledger.progress.Progress;
import org.seepledger.report.page.PrismPictures;
import org.seepledger.sketch.Limit;

/**
 * All that is handed over of the prisms that are drawn: a folder with one folder for each job, the prisms beside them.
 *
 * <p>The jobs are those of the commands, and their files the same, byte for byte but for timings. The folder appears whole
 * or not at all; an earlier one is replaced as a whole.
 */
public final class HandoverJob {

    private static final String COMMAND = "handover";

    private final Workbench set;
    private final HandoverRequest request;
    private final PngPainter painter;
    private final Progress progress;
    private final Stopwatch stopwatch = new Stopwatch();
    private final List<String> parts = new ArrayList<>();

    private HandoverJob(Workbench set, HandoverRequest request, PngPainter painter, Progress progress) {
        this.set = set;
        this.request = request;
        this.painter = painter;
        this.progress = progress;
    }

    /**
     * Does the job.
     *
     * @param set the open set
     * @param request what is to be handed over
     * @param painter paints pictures
     * @param progress told how far the work is
     * @return what it came to; the files are in place
     * @throws UsageFault if the request cannot be met, or the file of prisms holds others than are drawn
     * @throws org.seepledger.fault.DataFault if the data are wrong; nothing is written then
     * @throws org.seepledger.progress.Cancelled if the work was stopped; nothing is written then
     */
    public static HandoverOutcome run(Workbench set, HandoverRequest request, PngPainter painter, Progress progress) {
        try (OutputFolder out = OutputFolder.at(request.out(), COMMAND, request.overwrite());
                StandIns standIns = new StandIns()) {
            return new HandoverJob(set, request, painter, progress).run(out, standIns);
        } catch (IOException e) {
            throw new UsageFault("The folder " + request.out() + " cannot be written (" + Unreadable.reason(e)
                    + "). Make room or name another folder.");
        }
    }

    /**
     * Makes sure that a folder can be handed over in: a new or empty one, or one handed over earlier.
     *
     * @param out the folder
     * @param overwrite whether an earlier one may be replaced
     * @throws UsageFault if not
     */
    public static void mustBeUsable(Path out, boolean overwrite) {
        OutputFolder.mustBeUsable(out, COMMAND, overwrite);
    }

    private HandoverOutcome run(OutputFolder out, StandIns standIns) throws IOException {
        writePrisms(out, standIns);
        Optional<BalanceOutcome> balance = balance(out);
        Optional<PlumeOutcome> plume = request.plume().map(wanted -> {
            parts.add(HandoverRequest.SOLUTES);
            return PlumeJob.run(wanted.into(folder(out, HandoverRequest.SOLUTES)), progress);
        });
        if (request.extract().isPresent()) {
            parts.add(HandoverRequest.EXTRACT);
            ExtractJob.run(request.extract().get().into(folder(out, HandoverRequest.EXTRACT)), progress);
        }
        writeShown(out);
        progress.begin("putting files into place", 1);
        writeRecord(out);
        standIns.close();
        List<String> files = out.written();
        progress.step();
        out.publish();
        return new HandoverOutcome(request.out(), files, balance, plume);
    }

    private static Path folder(OutputFolder out, String name) {
        try {
            return out.file(name);
        } catch (IOException e) {
            throw new java.io.UncheckedIOException(e);
        }
    }

    /** The folder has the prisms in any case; where the jobs are to read these, they stand there from now on. */
    private void writePrisms(OutputFolder out, StandIns standIns) throws IOException {
        Path copy = out.file(HandoverRequest.PRISMS);
        if (!request.readsOwnPrisms()) {
            set.drawings().mustHold(request.prisms(), request.drawing());
            Files.copy(request.prisms(), copy);
        } else {
            set.drawings().write(copy, request.drawing());
            standIns.put(copy, request.prisms());
        }
        DataFolder beside = set.besides();
        for (Limit.Surface surface : request.drawing().surfaces()) {
            Path raster = out.file(surface.path());
            Files.copy(beside.resolve(surface.path(), "a surface of a prism"), raster);
            if (request.readsOwnPrisms()) {
                standIns.put(raster, request.out().resolve(surface.path()));
            }
        }
    }

    private Optional<BalanceOutcome> balance(OutputFolder out) throws IOException {
        if (request.balance().isEmpty()) {
            return Optional.empty();
        }
        parts.add(HandoverRequest.BUDGET);
        List<Prism> prisms = new ArrayList<>();
        List<PrismPictures> drawn = new ArrayList<>();
        BalanceOutcome outcome = BalanceJob.run(
                request.balance().get().into(out.file(HandoverRequest.BUDGET)),
                (of, pictures) -> {
                    prisms.addAll(of);
                    drawn.addAll(pictures);
                },
                progress);
        if (request.pictures().ofReport()) {
            parts.add(HandoverRequest.PICTURES);
            LocalDate date = request.balance().get().report().date();
            pictures(out, Optional.of(date)).writeOfReport(prisms, drawn);
        }
        return Optional.of(outcome);
    }

    private void writeShown(OutputFolder out) throws IOException {
        List<ShownPicture> shown = request.pictures().shown();
        if (!shown.isEmpty()) {
            PictureFiles files = pictures(out, Optional.empty());
            progress.begin("drawing pictures", shown.size());
            for (ShownPicture picture : shown) {
                files.write(picture.name(), picture.draws().apply(progress));
                progress.step();
            }
        }
    }

    private PictureFiles pictures(OutputFolder out, Optional<LocalDate> date) {
        String crs =
                set.crs().isLocal() ? "local coordinates" : set.crs().code().orElse("map coordinates");
        String made = "Aquifer \u201c" + set.aquifer().name() + "\u201d; " + crs + ". Drawn by seepledger "
                + Version.text() + date.map(day -> ", " + day).orElse("") + ".";
        return new PictureFiles(out, request.pictures(), painter, List.of(made, Disclaimer.text()));
    }

    private void writeRecord(OutputFolder out) throws IOException {
        String title = "Handing over of \"" + set.aquifer().name() + "\" by seepledger " + Version.text();
        FileRecord prisms = FileRecord.of(request.prisms().toString(), request.prisms());
        Map<String, String> options = new LinkedHashMap<>();
        options.put("prisms", request.prisms().toString());
        options.put("parts", String.join(", ", parts));
        Statement statement = new Statement(title, List.of(prisms), set.origins(), set.warnings());
        RunRecord.write(out, COMMAND, options, statement, List.of(), Map.of(), stopwatch);
    }
}
