package dev.nearlimit.journal;

import java.nio.file.Path;

/**
 * A process that claims pieces, keeps them one after the other until it is killed or done, and says of every ten that
 * they are in the file.
 */
final class JournalProcess {
    private JournalProcess() {}

    public static void main(String[] args) {
        long first = Long.parseLong(args[1]);
        long end = Long.parseLong(args[2]);
        try (SqliteJournal journal = SqliteJournal.open(Path.of(args[0]), "tool 1")) {
            journal.claim(JournalContract.OTHER, 0, 1000, 1000);
            for (long piece = first; piece < end; piece++) {
                if (journal.find(JournalContract.JOB, piece).isEmpty()) {
                    journal.keep(JournalContract.JOB, piece, JournalContract.content(piece));
                }
                if (piece % 10 == 9) {
                    journal.flush();
                    System.out.println(piece);
                }
            }
        }
    }

    /** Starts this class in a JVM of its own. */
    static Process start(Path folder, long first, long end) throws java.io.IOException {
        return new ProcessBuilder(
                        Path.of(System.getProperty("java.home"), "bin", "java").toString(),
                        "-Xmx64m",
                        "-XX:TieredStopAtLevel=1",
                        "--enable-native-access=ALL-UNNAMED",
                        "-Djava.io.tmpdir=" + folder,
                        "-cp",
                        System.getProperty("java.class.path"),
                        JournalProcess.class.getName(),
                        folder.resolve("journal.sqlite").toString(),
                        String.valueOf(first),
                        String.valueOf(end))
                .redirectError(ProcessBuilder.Redirect.INHERIT)
                .start();
    }
}
