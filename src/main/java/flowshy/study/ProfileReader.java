package flowshy.study;

import flowshy.hair.MeasuredProfile;
import flowshy.hair.Profile;
import flowshy.study.ColumnFile.Column;
import flowshy.study.keys.Form;
import flowshy.study.text.Position;
import flowshy.study.text.Problems;
import flowshy.study.text.StudyException;
import flowshy.study.units.Dimension;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/** The measured profile of a hair: from a file of columns z and diameter, or from pairs in the study. */
final class ProfileReader {
    private static final int MOST_ROWS = 10_000;

    /** As thin as the keys of the other shapes allow [m]. */
    private static final double THINNEST = 1e-8;

    /** As long as they allow [m]. */
    private static final double LONGEST = 1.0;

    private final Form form;
    private final Problems problems;
    private final FilesRead files;

    ProfileReader(Form form, Problems problems, FilesRead files) {
        this.form = form;
        this.problems = problems;
        this.files = files;
    }

    /** One height with its diameter [m], and where each stands. */
    private record Point(double height, double diameter, Position heightAt, Position diameterAt) {}

    Optional<Profile> read() {
        if (form.has("hair.points")) {
            return checked(pairs(), "hair.points");
        }
        if (form.has("hair.file")) {
            return checked(rows(), "hair.file");
        }
        problems.add(
                form.position("hair"),
                "hair.file",
                "missing",
                "a measured profile needs file (a table with columns z and diameter) or points (a list of pairs)");
        return Optional.empty();
    }

    private List<Point> pairs() {
        List<Point> points = new ArrayList<>();
        for (int i = 0; form.has("hair.points[" + i + "].z"); i++) {
            String z = "hair.points[" + i + "].z";
            String diameter = "hair.points[" + i + "].diameter";
            points.add(new Point(form.si(z), form.si(diameter), form.position(z), form.position(diameter)));
        }
        return points;
    }

    private List<Point> rows() {
        List<Point> points = new ArrayList<>();
        List<Column> wanted = List.of(
                new Column("z", Optional.of(Dimension.LENGTH)), new Column("diameter", Optional.of(Dimension.LENGTH)));
        try {
            ColumnFile table = files.table(form, "hair.file", wanted, MOST_ROWS);
            for (int i = 0; i < table.rows().size(); i++) {
                List<Double> row = table.rows().get(i);
                points.add(new Point(row.get(0), row.get(1), table.position(i, 0), table.position(i, 1)));
            }
        } catch (StudyException e) {
            e.problems().forEach(problems::add);
        }
        return points;
    }

    private Optional<Profile> checked(List<Point> points, String path) {
        if (problems.touches("hair") || points.isEmpty()) {
            return Optional.empty();
        }
        int before = problems.count();
        Point first = points.get(0);
        Point last = points.get(points.size() - 1);
        if (first.height() != 0.0) {
            problems.add(first.heightAt(), path, "the first height is not zero", "z counts from the wall, 0 first");
        }
        for (int i = 1; i < points.size(); i++) {
            if (!(points.get(i).height() > points.get(i - 1).height())) {
                problems.add(
                        points.get(i).heightAt(), path, "the height does not rise", "each z lies above the one before");
            }
        }
        for (Point point : points) {
            boolean pointed = point.equals(last) && point.diameter() == 0.0;
            if (!(point.diameter() > 0.0) && !pointed) {
                problems.add(point.diameterAt(), path, "a diameter not above zero", "only the tip may have diameter 0");
            } else if (point.diameter() < THINNEST && !pointed) {
                problems.add(point.diameterAt(), path, "thinner than 10 nm", "10 nm or more, or a tip of diameter 0");
            }
            if (!(point.diameter() <= last.height())) {
                problems.add(
                        point.diameterAt(), path, "wider than the hair is long", "a hair is at least as long as wide");
            }
        }
        if (!(last.height() <= LONGEST)) {
            problems.add(last.heightAt(), path, "longer than 1 m", "a hair of 1 m or less");
        }
        if (points.size() < 2) {
            problems.add(first.heightAt(), path, "one height only", "a profile has two heights or more");
        }
        return problems.count() == before ? Optional.of(profile(points)) : Optional.empty();
    }

    private static Profile profile(List<Point> points) {
        return new MeasuredProfile(
                points.stream().map(Point::height).toList(),
                points.stream().map(p -> 0.5 * p.diameter()).toList());
    }
}
