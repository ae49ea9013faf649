package org.soakwright.planner.report.page;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.soakwright.planner.batch.Run;
import org.soakwright.planner.batch.Trace;
import org.soakwright.planner.report.Csv;
import org.soakwright.planner.report.Findings;
import org.soakwright.planner.report.Folder;
import org.soakwright.planner.report.Section;
import org.soakwright.planner.report.compare.Comparison;
import org.soakwright.planner.report.compare.ComparisonJson;
import org.soakwright.planner.report.compare.Measure;
import org.soakwright.planner.report.compare.Side;
import org.soakwright.planner.report.picture.Overlay;
import org.soakwright.planner.report.picture.Picture;
import org.soakwright.planner.report.picture.Theme;
import org.soakwright.recipes.model.Species;

/**
 * The report of a comparison as the files of a folder: {@code index.html}, {@code comparison.json}, {@code tables/*.csv} and
 * {@code pictures/course.svg}.
 */
public final class ComparisonReport {
    /** No profile is looked at here. */
    private static final int LAYERS = 2;

    private final Comparison comparison;
    private final Findings findings;
    private final List<Picture> pictures;
    private final Map<String, String> tables = new LinkedHashMap<>();

    private ComparisonReport(Comparison comparison, Findings findings, List<Picture> pictures) {
        this.comparison = comparison;
        this.findings = findings;
        this.pictures = pictures;
    }

    /**
     * The files.
     *
     * @param version of this program
     * @param findings of the same comparison
     * @param a the first batch where it was followed, so that its course is known; else only its step ends are drawn
     * @param b the second
     */
    public static List<Folder.Entry> of(
            String version, Comparison comparison, Findings findings, Optional<Run> a, Optional<Run> b) {
        List<Overlay.Field> fields = fields(comparison, courses(comparison.a(), a), courses(comparison.b(), b));
        List<Picture> pictures = fields.isEmpty() ? List.of() : List.of(Overlay.of(fields));
        return new ComparisonReport(comparison, findings, pictures).entries(version);
    }

    private record Known(String unit, Overlay.Course course) {}

    private static Map<String, Known> courses(Side side, Optional<Run> run) {
        return run.isPresent() ? traced(run.get()) : atStepEnds(side);
    }

    private static Map<String, Known> traced(Run run) {
        Trace trace = Trace.of(run, LAYERS);
        Map<String, Known> courses = new LinkedHashMap<>();
        List<Species> species = run.batch().recipe().species();
        for (int s = 0; s < species.size(); s++) {
            courses.put(
                    species.get(s).name(),
                    new Known(species.get(s).start().unit().symbol(), Overlay.lotMean(trace, s)));
        }
        return courses;
    }

    /** What is not in a step is between steps, in equal parts. */
    private static Map<String, Known> atStepEnds(Side side) {
        int count = side.steps().size();
        double inSteps = side.steps().stream().mapToDouble(Side.Step::seconds).sum();
        double between = count < 2 ? 0 : (side.seconds() - inSteps) / (count - 1);
        double[] clocks = new double[count];
        double clock = 0;
        for (int i = 0; i < count; i++) {
            clock += side.steps().get(i).seconds() + (i > 0 ? between : 0);
            clocks[i] = clock;
        }
        Map<String, Known> courses = new LinkedHashMap<>();
        if (count > 0) {
            side.steps().get(0).means().forEach((species, first) -> {
                double[] contents = side.steps().stream()
                        .mapToDouble(step ->
                                step.means().getOrDefault(species, first).value())
                        .toArray();
                courses.put(species, new Known(first.unit(), new Overlay.Course(clocks, contents)));
            });
        }
        return courses;
    }

    /** A field for each species; of those that the two count in different units, only the first batch's. */
    private static List<Overlay.Field> fields(
            Comparison comparison, Map<String, Known> coursesA, Map<String, Known> coursesB) {
        List<Overlay.Field> fields = new ArrayList<>();
        for (Comparison.ReadingRow row : comparison.readings()) {
            if (row.grade().equals("lot")) {
                Optional<Known> a = Optional.ofNullable(coursesA.get(row.species()));
                Optional<Known> b = Optional.ofNullable(coursesB.get(row.species()));
                String unit = a.or(() -> b).map(Known::unit).orElse("");
                fields.add(new Overlay.Field(
                        row.species(),
                        unit,
                        a.map(Known::course),
                        b.filter(known -> known.unit().equals(unit)).map(Known::course)));
            }
        }
        return fields;
    }

    private List<Folder.Entry> entries(String version) {
        totals();
        steps();
        targets();
        readings();
        ends();
        List<Folder.Entry> entries = new ArrayList<>();
        entries.add(Folder.Entry.of("comparison.json", ComparisonJson.of(version, comparison)));
        tables.forEach((name, text) -> entries.add(Folder.Entry.of(name, text)));
        pictures.forEach(
                picture -> entries.add(Folder.Entry.of("pictures/" + picture.id() + ".svg", picture.svg(Theme.LIGHT))));
        entries.add(0, Folder.Entry.of("index.html", page(version)));
        return entries;
    }

    private String page(String version) {
        Shell shell = new Shell("Comparison", findings.title(), findings.about());
        Html html = shell.html();
        List<Shell.Anchor> anchors = new ArrayList<>();
        if (!pictures.isEmpty()) {
            anchors.add(new Shell.Anchor("pictures", "Picture"));
        }
        findings.sections().forEach(section -> anchors.add(new Shell.Anchor(section.id(), section.heading())));
        shell.contents(anchors);
        html.open("main");
        shell.openAnswer(findings);
        shell.close();
        if (!pictures.isEmpty()) {
            shell.open("pictures", "Picture");
            pictures.forEach(shell::picture);
            shell.close();
        }
        for (Section section : findings.sections()) {
            shell.section(section, List.copyOf(tables.keySet()));
        }
        html.close();
        shell.footer(List.of(
                "Soakwright " + version + " computed this.", origin("A", comparison.a()), origin("B", comparison.b())));
        return shell.end();
    }

    private static String origin(String name, Side side) {
        return name + ": " + side.file() + ", recipe SHA-256 " + side.sha256() + ".";
    }

    private void add(String name, Csv csv) {
        tables.put(Tables.file(name), csv.toString());
    }

    private static Csv measure(Csv csv, Measure measure) {
        return csv.number(measure.a()).number(measure.b()).number(measure.difference());
    }

    private void totals() {
        Csv csv = new Csv(List.of("total", "A", "B", "B - A", "unit"));
        measure(csv.text("time"), comparison.seconds()).text("s").end();
        measure(csv.text("liquor"), comparison.litres()).text("L").end();
        measure(csv.text("cost"), comparison.cost())
                .text(comparison.cost().unit())
                .end();
        add(Findings.TOTALS, csv);
    }

    private void steps() {
        Csv csv = new Csv(List.of("step", "kind", "A [s]", "B [s]", "B - A [s]"));
        comparison
                .steps()
                .forEach(row -> measure(csv.text(row.step()).text(row.kind()), row.seconds())
                        .end());
        add(Findings.STEPS, csv);
    }

    private void targets() {
        if (comparison.targets().isEmpty()) {
            return;
        }
        Csv csv = new Csv(List.of("target", "limit", "A", "B", "B - A", "unit", "A met", "B met"));
        comparison
                .targets()
                .forEach(row -> measure(csv.text(row.target()).text(row.limit()), row.value())
                        .text(row.value().unit())
                        .text(met(row.a()))
                        .text(met(row.b()))
                        .end());
        add(Findings.TARGETS, csv);
    }

    private static String met(Optional<Side.Target> target) {
        return target.map(one -> one.met() ? "yes" : "no").orElse("");
    }

    private void readings() {
        Csv csv = new Csv(List.of("species", "grade", "reading", "A", "B", "B - A", "unit"));
        comparison
                .readings()
                .forEach(
                        row -> measure(csv.text(row.species()).text(row.grade()).text(row.reading()), row.content())
                                .text(row.content().unit())
                                .end());
        add("readings", csv);
    }

    private void ends() {
        Csv csv = new Csv(List.of("step", "species", "in", "A", "B", "B - A", "unit"));
        comparison
                .ends()
                .forEach(row -> measure(csv.text(row.step()).text(row.species()).text(row.where()), row.content())
                        .text(row.content().unit())
                        .end());
        add(Findings.EXPECTED, csv);
    }
}
