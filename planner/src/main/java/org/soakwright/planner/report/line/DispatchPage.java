package org.soakwright.planner.report.line;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.soakwright.planner.report.Section;
import org.soakwright.planner.report.Stamp;
import org.soakwright.planner.report.page.Shell;

/** The dispatch list to be printed: a page for each shift, with room to tick off what is done. */
final class DispatchPage {
    private static final String STYLE = """
            #answer { border-color: var(--mark); }
            td:last-child { min-width: 7rem; }
            tbody th { white-space: nowrap; }
            @media print {
              main > section:nth-of-type(n + 3) { break-before: page; margin-top: 0; }
              thead { display: table-header-group; }
              td, th { padding-top: 0.45rem; padding-bottom: 0.45rem; }
            }
            """;

    private DispatchPage() {}

    static String of(Account account, Stamp stamp) {
        LineTables tables = new LineTables(account);
        Shell shell = new Shell("Dispatch list", account.plan().line().title(), tables.about(), STYLE);
        List<Shifts.Worked> shifts = Shifts.of(account.plan(), account.moves());
        List<Shell.Anchor> anchors = new ArrayList<>();
        for (int i = 0; i < shifts.size(); i++) {
            anchors.add(new Shell.Anchor(id(i), shifts.get(i).name()));
        }
        shell.contents(anchors);
        shell.html().open("main");
        shell.open("answer", "How to use it");
        shell.paragraphs(List.of(
                account.isGood()
                        ? "Moves in the order in which they begin. Where one comes late, look at the sheet of its lot for the"
                                + " latest pull before anything else is moved."
                        : "This plan has lots that are late or miss a target, or a caution forbids it: see index.html before"
                                + " anything is moved.",
                "Write the time at which a move was done and your initials into the last column."));
        shell.close();
        for (int i = 0; i < shifts.size(); i++) {
            Shifts.Worked shift = shifts.get(i);
            shell.section(
                    new Section(id(i), shift.name(), Optional.of(tables.dispatch(shift.moves())), List.of(), List.of()),
                    List.of());
        }
        shell.html().close();
        LinePage.footer(shell, stamp);
        return shell.end();
    }

    private static String id(int shift) {
        return "shift-" + (shift + 1);
    }
}
