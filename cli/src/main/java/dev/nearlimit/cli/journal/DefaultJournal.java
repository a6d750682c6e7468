package dev.nearlimit.cli.journal;

import java.nio.file.Path;
import java.util.Locale;
import java.util.Map;

/** Where the journal is kept unless the user says otherwise: under the data folder that the system has for users. */
public final class DefaultJournal {
    private DefaultJournal() {}

    /** The file for the user of this process. */
    public static Path location() {
        return location(System.getenv(), System.getProperty("os.name"), Path.of(System.getProperty("user.home")));
    }

    /**
     * XDG_DATA_HOME where it is set to an absolute path, as its specification demands (XDG Base Directory
     * Specification 0.8); else what is customary on the system.
     */
    static Path location(Map<String, String> environment, String system, Path home) {
        String name = system.toLowerCase(Locale.ROOT);
        Path data;
        if (isAbsolute(environment.get("XDG_DATA_HOME"))) {
            data = Path.of(environment.get("XDG_DATA_HOME"));
        } else if (name.startsWith("windows") && isAbsolute(environment.get("LOCALAPPDATA"))) {
            data = Path.of(environment.get("LOCALAPPDATA"));
        } else if (name.startsWith("mac")) {
            data = home.resolve("Library").resolve("Application Support");
        } else {
            data = home.resolve(".local").resolve("share");
        }
        return data.resolve("nearlimit").resolve("journal.sqlite");
    }

    private static boolean isAbsolute(String path) {
        return path != null && !path.isEmpty() && Path.of(path).isAbsolute();
    }
}
