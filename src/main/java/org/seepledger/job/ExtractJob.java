package org.seepledger.job;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import org.seepledger.aquifer.Grid;
import org.seepledger.io.aquifer.AquiferCut;
import org.seepledger.io.raster.GeoTiff;
import org.seepledger.io.raster.RasterCut;
import org.seepledger.io.result.RunJson;
import org.seepledger.io.result.Statement;
import org.seepledger.prism.PrismCut;
import org.seepledger.prism.Surroundings;
import org.seepledger.progress.Progress;

/** A copy of an aquifer folder with just what prisms' budgets rest on, which gives the same budgets digit for digit. */
public final class ExtractJob {

    private final ExtractRequest request;
    private final Subject subject;
    private final Progress progress;
    private final Stopwatch stopwatch = new Stopwatch();

    private ExtractJob(ExtractRequest request, Subject subject, Progress progress) {
        this.request = request;
        this.subject = subject;
        this.progress = progress;
    }

    /**
     * Does the job.
     *
     * @param request what is asked for
     * @param progress told how far the work is
     * @return the summary, lines of text; the files are in place
     * @throws org.seepledger.fault.UsageFault if the request cannot be met
     * @throws org.seepledger.fault.DataFault if the data are wrong; nothing is written then
     * @throws org.seepledger.progress.Cancelled if the work was stopped; nothing is written then
     * @throws IOException if a file cannot be read or written
     */
    public static String run(ExtractRequest request, Progress progress) throws IOException {
        try (OutputFolder out = OutputFolder.at(request.out(), "extract", request.overwrite());
                Subject subject = Subject.open(request.aquifer(), request.prisms(), request.clip())) {
            return new ExtractJob(request, subject, progress).run(out);
        }
    }

    private String run(OutputFolder out) throws IOException {
        Grid grid = subject.aquifer().grid();
        List<PrismCut> cuts =
                subject.prisms().stream().map(prism -> PrismCut.of(prism, grid)).toList();
        Surroundings cells = Surroundings.of(cuts, grid);
        stopwatch.lap("reading");
        int files = subject.folder().inputs().size() + subject.surfaces().size() + 1;
        progress.begin("copying", files);
        AquiferCut.Target target = name -> {
            progress.step();
            return out.file(name);
        };
        AquiferCut.write(subject.folder(), subject.crs(), cells, target);
        String prisms = copyPrisms(cells, target);
        writeRecord(out);
        List<String> written = out.written();
        out.publish();
        return summary(cells, prisms, written.size());
    }

    /** Copies the prisms and their surfaces; beside the aquifer's files, or in a folder of their own if names clash. */
    private String copyPrisms(Surroundings cells, AquiferCut.Target target) throws IOException {
        Map<String, Path> files = new LinkedHashMap<>(subject.surfaces());
        String name = request.prisms().getFileName().toString();
        files.put(name, request.prisms());
        boolean clash = false;
        for (Map.Entry<String, Path> file : files.entrySet()) {
            Path other = subject.folder().inputs().get(file.getKey());
            clash |= file.getKey().equals(RunJson.NAME) || other != null && !Files.isSameFile(other, file.getValue());
        }
        String folder = clash ? "prisms/" : "";
        Files.copy(request.prisms(), target.file(folder + name));
        for (Map.Entry<String, Path> surface : subject.surfaces().entrySet()) {
            if (clash || !subject.folder().inputs().containsKey(surface.getKey())) {
                try (GeoTiff raster = GeoTiff.open(surface.getValue(), surface.getKey())) {
                    Path to = target.file(folder + surface.getKey());
                    RasterCut.write(raster, subject.aquifer().grid(), subject.crs(), cells, to);
                }
            }
        }
        return folder + name;
    }

    private void writeRecord(OutputFolder out) throws IOException {
        String title = "Extract of \"" + subject.aquifer().name() + "\"";
        Statement statement = subject.statement(title, progress);
        Map<String, String> options = RunRecord.options(request.aquifer(), request.prisms());
        options.put("clip", String.valueOf(request.clip()));
        RunRecord.write(out, "extract", options, statement, subject.notes(), Map.of(), stopwatch);
    }

    private String summary(Surroundings cells, String prisms, int files) {
        Grid grid = subject.aquifer().grid();
        StringBuilder text = new StringBuilder();
        text.append("Kept ").append(cells.count()).append(" of ");
        text.append((long) grid.rows() * grid.columns()).append(" columns of cells; the others have no value.\n");
        subject.notes().forEach(note -> text.append("Note: ").append(note).append('\n'));
        text.append("Written to ").append(request.out()).append(": ");
        text.append(files).append(" files, all named in run.json.\n");
        text.append("Strike its budget with: seepledger balance ").append(request.out());
        text.append(" --prisms ").append(request.out().resolve(prisms)).append(" --out DIR");
        text.append(request.clip() ? " --clip\n" : "\n");
        return text.toString();
    }
}
