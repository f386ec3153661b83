package flowshy.cli;

import flowshy.report.FileReport.Written;
import flowshy.report.WholeFile;
import flowshy.report.pdf.PdfPage;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.NoSuchFileException;
import java.nio.file.Path;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import java.util.function.Function;
import picocli.CommandLine;
import picocli.CommandLine.Option;
import picocli.CommandLine.ParameterException;

/** Where the pages of {@code report} go: a file for one study, a folder for several. */
final class ReportFiles {
    @Option(
            names = "--out",
            paramLabel = "FILE.html",
            description = "the page; for several studies a folder that is there, with one page a study")
    private Path page;

    @Option(names = "--pdf", paramLabel = "FILE.pdf", description = "the same as PDF; for several studies a folder")
    private Path sheet;

    private Map<String, String> names = Map.of();

    /**
     * Whether a page is asked for.
     *
     * @return true if so
     */
    boolean asked() {
        return page != null || sheet != null;
    }

    /**
     * Whether the words go together, before anything is computed.
     *
     * @param line the command
     * @param studies as named
     * @throws ParameterException if no file is named, one is of another kind, or names of pages would collide
     */
    void check(CommandLine line, List<Path> studies) {
        if (page == null && sheet == null) {
            throw new ParameterException(line, "name the page: --out FILE.html, or --pdf FILE.pdf, or both");
        }
        names = names(studies);
        target(line, "--out", page, ".html", studies.size());
        target(line, "--pdf", sheet, ".pdf", studies.size());
        if (names.values().stream().distinct().count() < studies.size()) {
            throw new ParameterException(
                    line, "two of these studies would write the same page; report them one by one");
        }
    }

    private static void target(CommandLine line, String option, Path target, String ending, int studies) {
        if (target == null || Files.isDirectory(target)) {
            return;
        }
        if (studies > 1) {
            throw new ParameterException(
                    line,
                    option + " " + target + " must be a folder that is there, for " + studies + " studies are named");
        }
        if (!target.toString().toLowerCase(Locale.ROOT).endsWith(ending)) {
            throw new ParameterException(
                    line, option + " " + target + " is neither a folder nor does it end in " + ending);
        }
    }

    /** Stem of a page by study file; the folder's name before it where two files have one name. */
    private static Map<String, String> names(List<Path> studies) {
        Map<String, String> names = new LinkedHashMap<>();
        for (Path study : studies) {
            boolean alone = studies.stream()
                            .filter(other -> stem(other).equals(stem(study)))
                            .count()
                    == 1;
            Optional<String> folder = Optional.ofNullable(
                            study.toAbsolutePath().normalize().getParent())
                    .map(Path::getFileName)
                    .map(Path::toString);
            names.put(study.toString(), alone ? stem(study) : folder.orElse("") + "-" + stem(study));
        }
        return names;
    }

    private static String stem(Path study) {
        String name = String.valueOf(study.getFileName());
        return name.replaceFirst("\\.ya?ml$", "");
    }

    /**
     * Writes the page of one study; every form is made before the first is written.
     *
     * @param study its file as named
     * @param html the page
     * @return what was written
     * @throws UserException if a file cannot be written
     */
    List<Written> write(String study, String html) {
        Map<Path, byte[]> bytes = new LinkedHashMap<>();
        put(bytes, page, names.get(study) + ".html", text -> text.getBytes(StandardCharsets.UTF_8), html);
        put(bytes, sheet, names.get(study) + ".pdf", PdfPage::of, html);
        writeAll(bytes);
        return bytes.entrySet().stream()
                .map(file -> Written.of(file.getKey().toString(), file.getValue()))
                .toList();
    }

    private static void put(
            Map<Path, byte[]> bytes, Path target, String name, Function<String, byte[]> form, String html) {
        if (target != null) {
            bytes.put(Files.isDirectory(target) ? target.resolve(name) : target, form.apply(html));
        }
    }

    /** All of them or none, and into folders that are there. */
    private static void writeAll(Map<Path, byte[]> bytes) {
        Path first = bytes.keySet().iterator().next();
        for (Path target : bytes.keySet()) {
            if (!Files.isDirectory(folder(target))) {
                throw new UserException(Failures.notWritten(target, new NoSuchFileException(target.toString())));
            }
        }
        try {
            WholeFile.writeAll(folder(first), bytes);
        } catch (IOException e) {
            throw new UserException(Failures.notWritten(first, e));
        }
    }

    private static Path folder(Path file) {
        return file.toAbsolutePath().resolveSibling("");
    }
}
