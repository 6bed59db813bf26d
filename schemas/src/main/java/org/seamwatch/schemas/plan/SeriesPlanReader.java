package org.seamwatch.schemas.plan;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.function.Function;
import org.jspecify.annotations.Nullable;

/** Reads one item of {@code series}. */
final class SeriesPlanReader {

    static final List<String> MEASURES = List.of("count", "rate", "eb-rate", "share-residual");

    private static final List<String> KEYS = List.of(
            "geography",
            "conditions",
            "from",
            "dayOf",
            "closeAfter",
            "reviseFor",
            "windowDays",
            "statistics",
            "measure",
            "permutations",
            "contiguity",
            "weights",
            "thinBelow",
            "share",
            "learning",
            "charts",
            "holidays");

    private SeriesPlanReader() {}

    static SeriesPlan read(YamlValue item, List<String> geographies) {
        YamlMap map = item.map().only(KEYS);
        YamlMap learning = map.map("learning", List.of("warmUpDays"));
        YamlValue from = map.get("from");
        int window = map.integer("windowDays", 1, 90, 1);
        List<StatisticName> statistics = statistics(map.get("statistics"));
        YamlValue measure = map.get("measure");
        return new SeriesPlan(
                map.required("geography").word("geography", geographies),
                conditions(map.required("conditions")),
                from == null ? null : from.date(),
                choice(map.get("dayOf"), "date", DayOf.values(), DayOf::word, DayOf.REPORT),
                map.days("closeAfter", 0, 365, 1),
                map.days("reviseFor", 0, 365, 28),
                window,
                statistics,
                measure == null ? "share-residual" : measure.word("measure", MEASURES),
                map.integer("permutations", 0, 99_999, 999),
                ContiguityReader.read(map.get("contiguity")),
                choice(map.get("weights"), "weights", WeightStyle.values(), WeightStyle::word, WeightStyle.BINARY),
                map.integer("thinBelow", 0, 1_000_000, 20),
                map.above0("share", 1),
                learning.integer("warmUpDays", 5, 3650, window > 1 ? 90 : 28),
                ChartsReader.read(map.get("charts"), statistics),
                holidays(map.get("holidays")));
    }

    private static List<String> conditions(YamlValue value) {
        List<String> conditions = new ArrayList<>();
        for (YamlValue item : value.filledList()) {
            if (conditions.contains(item.id())) {
                throw item.rule("must be there once, is \"" + item.id() + "\" again");
            }
            conditions.add(item.id());
        }
        return conditions;
    }

    private static List<StatisticName> statistics(@Nullable YamlValue value) {
        if (value == null) {
            return List.of(StatisticName.MORAN);
        }
        List<StatisticName> statistics = new ArrayList<>();
        for (YamlValue item : value.filledList()) {
            StatisticName name = choice(item, "statistic", StatisticName.values(), StatisticName::word);
            if (statistics.contains(name)) {
                throw item.rule("must be there once, is \"" + name.word() + "\" again");
            }
            statistics.add(name);
        }
        return statistics;
    }

    private static List<HolidayPlan> holidays(@Nullable YamlValue value) {
        if (value == null) {
            return List.of();
        }
        List<HolidayPlan> holidays = new ArrayList<>();
        for (YamlValue item : value.list()) {
            if (item.isMap()) {
                YamlMap map = item.map().only(List.of("day", "regions"));
                holidays.add(new HolidayPlan(map.required("day").date(), map.patterns("regions")));
            } else {
                holidays.add(new HolidayPlan(item.date(), "*"));
            }
        }
        return holidays;
    }

    /** The constant whose word is written, or the default where nothing is. */
    static <E> E choice(@Nullable YamlValue value, String what, E[] constants, Function<E, String> word, E otherwise) {
        return value == null ? otherwise : choice(value, what, constants, word);
    }

    private static <E> E choice(YamlValue value, String what, E[] constants, Function<E, String> word) {
        List<String> words = Arrays.stream(constants).map(word).toList();
        return constants[words.indexOf(value.word(what, words))];
    }
}
