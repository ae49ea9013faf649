package org.soakwright.planner.report.line;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.soakwright.planner.line.LinePlan;
import org.soakwright.planner.line.LoadPlan;
import org.soakwright.planner.report.Findings;
import org.soakwright.planner.report.Section;
import org.soakwright.planner.report.Table;

/** What there is to say about a planned line, in words and tables, for whatever shows it. */
public final class LineFindings {
    static final String LOTS = "lots";
    static final String LATE = "late";
    static final String MISSED = "missed";
    static final String MOVES = "moves";
    static final String LIQUOR = "liquor";
    static final String NOTES = "notes";
    static final String CAUTIONS = "cautions";

    /** More loads than these are not listed one by one on a terminal. */
    private static final int MOST_LOADS = 60;

    /** Moves shown on a terminal. */
    private static final int MOST_MOVES = 12;

    private final Account account;
    private final LineTables tables;

    private LineFindings(Account account) {
        this.account = account;
        tables = new LineTables(account);
    }

    /** For a terminal: long lists are cut, with a word about where the rest stands. */
    public static Findings of(LinePlan plan) {
        return new LineFindings(new Account(plan)).findings(MOST_LOADS, MOST_MOVES);
    }

    /** All of it, but for the moves, which are told by shift. */
    static Findings whole(Account account) {
        return new LineFindings(account).findings(Integer.MAX_VALUE, 0);
    }

    private Findings findings(int mostLoads, int mostMoves) {
        List<Section> sections = new ArrayList<>();
        sections.add(lots(mostLoads));
        if (!account.lateLots().isEmpty()) {
            sections.add(Section.of(LATE, "Why lots are late", tables.late()));
        }
        if (!account.missing().isEmpty()) {
            sections.add(Section.of(MISSED, "Targets that are missed", tables.missed()));
        }
        if (mostMoves > 0) {
            sections.add(moves(mostMoves));
        }
        if (!account.supplies().isEmpty()) {
            sections.add(Section.of(LIQUOR, "Water and what to dissolve, by day", tables.days(), tables.uncounted()));
        }
        if (!account.plan().notes().isEmpty()) {
            sections.add(Section.of(NOTES, "Notes", account.plan().notes()));
        }
        sections.add(Section.of(CAUTIONS, "Cautions", account.cautions()));
        return new Findings(
                account.plan().line().title(),
                tables.about(),
                new LineAnswer(account).sentences(),
                account.isGood(),
                sections);
    }

    private Section lots(int most) {
        List<LoadPlan> loads = account.plan().loads();
        // What went wrong is shown in any case.
        List<LoadPlan> shown = loads.size() <= most
                ? loads
                : loads.stream().filter(load -> tables.isBad(load)).limit(most).toList();
        int left = loads.size() - shown.size();
        List<String> notes = new ArrayList<>(List.of("Against due in hours and minutes."));
        if (left > 0) {
            notes.add((shown.isEmpty() ? "All " + left : left + " more")
                    + " are in time and meet their targets; --report DIR lists them.");
        }
        return shown.isEmpty()
                ? new Section(LOTS, "Lots", Optional.empty(), List.of(), notes)
                : Section.of(LOTS, "Lots", tables.lots(shown, most < Integer.MAX_VALUE), notes);
    }

    private Section moves(int most) {
        List<Move> moves = account.moves();
        if (moves.isEmpty()) {
            return Section.of(MOVES, "What to do", List.of("Nobody is needed: moves take no time on this line."));
        }
        Table table = tables.moves(moves.subList(0, Math.min(most, moves.size())), false);
        int left = moves.size() - most;
        return Section.of(
                MOVES,
                "What to do, shift by shift",
                table,
                left <= 0
                        ? List.of()
                        : List.of("And " + left + " more until "
                                + tables.times().wall(account.plan().schedule().makespan())
                                + "; --report DIR writes all of them, a sheet for every lot and a calendar."));
    }
}
