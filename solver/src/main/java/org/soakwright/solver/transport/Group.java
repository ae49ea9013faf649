package org.soakwright.solver.transport;

/** What a correlation's range is stated in. */
enum Group {
    REYNOLDS("Reynolds number", "1"),
    SCHMIDT("Schmidt number", "1"),
    RAYLEIGH("Rayleigh number", "1"),
    PECLET("Reynolds times Schmidt number", "1"),
    VOIDS("share of voids", "1"),
    ASPECT("longest over shortest side", "1"),
    DIAMETER("diameter", "m");

    final String title;
    final String unit;

    Group(String title, String unit) {
        this.title = title;
        this.unit = unit;
    }
}
