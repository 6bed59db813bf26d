package org.seamwatch.processors.watch;

import java.nio.file.Path;
import java.time.Duration;
import java.time.LocalDate;
import java.time.ZoneId;
import java.time.ZoneOffset;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.function.Consumer;
import org.jspecify.annotations.Nullable;
import org.locationtech.jts.geom.Coordinate;
import org.locationtech.jts.geom.Geometry;
import org.locationtech.jts.geom.GeometryFactory;
import org.seamwatch.schemas.geography.Geography;
import org.seamwatch.schemas.geography.Region;
import org.seamwatch.schemas.plan.ChartPlan;
import org.seamwatch.schemas.plan.ContiguityRule;
import org.seamwatch.schemas.plan.DayOf;
import org.seamwatch.schemas.plan.GeographyPlan;
import org.seamwatch.schemas.plan.HolidayPlan;
import org.seamwatch.schemas.plan.Plan;
import org.seamwatch.schemas.plan.RunPlan;
import org.seamwatch.schemas.plan.SeriesPlan;
import org.seamwatch.schemas.plan.Sides;
import org.seamwatch.schemas.plan.StatisticName;
import org.seamwatch.schemas.plan.TopicsPlan;
import org.seamwatch.schemas.plan.WeightStyle;

/** Plans over a grid of unit squares, for tests; each method gives a desk that differs in one thing. */
public final class TestDesk implements Cloneable {

    private int side = 5;
    private boolean populated = true;
    private ZoneId zone = ZoneOffset.UTC;
    private List<String> conditions = List.of("influenza");
    private @Nullable LocalDate from;
    private DayOf dayOf = DayOf.EVENT;
    private int closeAfter = 1;
    private int reviseFor = 28;
    private int window = 1;
    private String measure = "count";
    private int permutations = 9;
    private int thinBelow = 1;
    private int warmUp = 5;
    private double falseAlarms = 6;
    private List<HolidayPlan> holidays = List.of();

    private TestDesk() {}

    /** Five by five squares, one condition, event dates, counts measured, everything usable early. */
    public static TestDesk small() {
        return new TestDesk();
    }

    private TestDesk with(Consumer<TestDesk> change) {
        try {
            TestDesk copy = (TestDesk) clone();
            change.accept(copy);
            return copy;
        } catch (CloneNotSupportedException e) {
            throw new IllegalStateException(e);
        }
    }

    public TestDesk side(int squares) {
        return with(d -> d.side = squares);
    }

    public TestDesk unpopulated() {
        return with(d -> d.populated = false);
    }

    public TestDesk zone(String id) {
        return with(d -> d.zone = ZoneId.of(id));
    }

    public TestDesk conditions(String... names) {
        return with(d -> d.conditions = List.of(names));
    }

    public TestDesk from(String day) {
        return with(d -> d.from = LocalDate.parse(day));
    }

    public TestDesk dayOf(DayOf basis) {
        return with(d -> d.dayOf = basis);
    }

    public TestDesk days(int newCloseAfter, int newReviseFor, int newWindow) {
        return with(d -> {
            d.closeAfter = newCloseAfter;
            d.reviseFor = newReviseFor;
            d.window = newWindow;
        });
    }

    public TestDesk measure(String name, int newPermutations) {
        return with(d -> {
            d.measure = name;
            d.permutations = newPermutations;
        });
    }

    public TestDesk limits(int newThinBelow, int newWarmUp, double newFalseAlarms) {
        return with(d -> {
            d.thinBelow = newThinBelow;
            d.warmUp = newWarmUp;
            d.falseAlarms = newFalseAlarms;
        });
    }

    public TestDesk holidays(HolidayPlan... days) {
        return with(d -> d.holidays = List.of(days));
    }

    /** Id of the square in a column and row, from 0. */
    public static String region(int column, int row) {
        return String.format(Locale.ROOT, "R%02d%02d", column, row);
    }

    public List<String> regions() {
        return geography().regions().stream().map(Region::id).toList();
    }

    public SeriesPlan seriesPlan() {
        return new SeriesPlan(
                "gridland",
                conditions,
                from,
                dayOf,
                closeAfter,
                reviseFor,
                window,
                List.of(StatisticName.MORAN),
                measure,
                permutations,
                new ContiguityRule.Edge(),
                WeightStyle.BINARY,
                thinBelow,
                1,
                warmUp,
                Map.of(StatisticName.MORAN, List.of(new ChartPlan.Ewma(0.2, 1, Sides.UPPER))),
                holidays);
    }

    public Geography geography() {
        return geography("gridland", "Square ");
    }

    public Geography geography(String id, String namePrefix) {
        List<Region> regions = new ArrayList<>();
        for (int column = 0; column < side; column++) {
            for (int row = 0; row < side; row++) {
                Double people = populated ? 10_000.0 + 1_000 * column + 100 * row : null;
                regions.add(
                        new Region(region(column, row), namePrefix + column + " " + row, people, square(column, row)));
            }
        }
        GeographyPlan plan = new GeographyPlan(
                Path.of(id + ".geojson"), id, zone, "id", "name", "population", populated ? 2023 : null, "*", 0);
        return new Geography(plan, regions, "0".repeat(64));
    }

    private static Geometry square(double x, double y) {
        return new GeometryFactory().createPolygon(new Coordinate[] {
            new Coordinate(x, y),
            new Coordinate(x + 1, y),
            new Coordinate(x + 1, y + 1),
            new Coordinate(x, y + 1),
            new Coordinate(x, y)
        });
    }

    public Watch watch() {
        Geography geography = geography();
        return Watch.of(plan(List.of(geography), falseAlarms, seriesPlan()), List.of(geography));
    }

    /** A plan of several series over geographies. */
    public static Plan plan(List<Geography> geographies, double falseAlarms, SeriesPlan... series) {
        return new Plan(
                Path.of("plan.yaml"),
                Map.of(),
                new RunPlan(1, 0),
                new TopicsPlan("seamwatch.", 1, 1, 1, Duration.ofDays(30)),
                geographies.stream().map(Geography::plan).toList(),
                falseAlarms,
                List.of(series));
    }
}
