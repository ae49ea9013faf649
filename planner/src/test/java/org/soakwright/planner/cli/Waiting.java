package org.soakwright.planner.cli;

/** A process that has begun a command, reports progress after more than a second, and then waits to be ended. */
final class Waiting {
    private Waiting() {}

    public static void main(String[] args) throws InterruptedException {
        Session session = new Session(System.out, System.err, false, true);
        Runtime.getRuntime().addShutdownHook(new Thread(session::interrupt));
        Thread.sleep(1100);
        session.line().at("choosing durations", 0.25);
        System.out.println("waiting");
        Thread.sleep(60_000);
    }
}
