package dev.nearlimit.journal;

import java.io.IOException;
import java.io.InputStream;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardCopyOption;
import java.util.Arrays;
import org.sqlite.SQLiteJDBCLoader;
import org.sqlite.util.LibraryLoaderUtil;
import org.sqlite.util.OSInfo;

/**
 * Where SQLite's native library lies while it is in use. By itself the driver unpacks a copy into the temporary folder at
 * every start and deletes it at the end, so that each killed process leaves one behind. Kept in a folder of the user, one
 * copy serves all starts.
 */
public final class SqliteLibrary {
    private static final String LOADED_FROM = "org.sqlite.lib.path";

    private static Path folder;

    private SqliteLibrary() {}

    /**
     * Has the library kept in a folder, from the next time on that the process opens its first journal. The folder is made
     * then; where it cannot be written, the driver does as it does by itself.
     */
    public static synchronized void keepIn(Path chosen) {
        folder = chosen;
    }

    /** Sees that the library is there. Called before the driver loads it. */
    static synchronized void prepare() {
        if (folder == null || System.getProperty(LOADED_FROM) != null) {
            return;
        }
        String name = LibraryLoaderUtil.getNativeLibName();
        String platform = OSInfo.getNativeLibFolderPathForCurrentOS().replace('/', '-');
        Path place = folder.resolve("sqlite-" + SQLiteJDBCLoader.getVersion() + "-" + platform);
        try {
            unpack(LibraryLoaderUtil.getNativeLibResourcePath() + "/" + name, place.resolve(name));
        } catch (IOException e) {
            // A full or read-only disk: whether a journal can be had is for its file to say, not for this copy.
            return;
        }
        System.setProperty(LOADED_FROM, place.toAbsolutePath().toString());
    }

    /** Puts the library there unless it is there already, bit for bit; another process may be doing the same. */
    private static void unpack(String resource, Path library) throws IOException {
        byte[] content;
        try (InputStream packed = SQLiteJDBCLoader.class.getResourceAsStream(resource)) {
            if (packed == null) {
                throw new IOException("the driver has no library for this system");
            }
            content = packed.readAllBytes();
        }
        if (Files.isRegularFile(library) && Arrays.equals(content, Files.readAllBytes(library))) {
            return;
        }
        Files.createDirectories(library.getParent());
        Path unfinished = Files.createTempFile(library.getParent(), "unpacking", null);
        try {
            Files.write(unfinished, content);
            Files.move(unfinished, library, StandardCopyOption.REPLACE_EXISTING, StandardCopyOption.ATOMIC_MOVE);
        } finally {
            Files.deleteIfExists(unfinished);
        }
    }
}
