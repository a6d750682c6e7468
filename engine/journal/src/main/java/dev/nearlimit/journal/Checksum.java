package dev.nearlimit.journal;

import java.util.zip.CRC32C;

/** The checksum that is kept with a piece: SQLite itself does not notice a bit that has turned on the disk. */
final class Checksum {
    private Checksum() {}

    static long of(byte[] content) {
        CRC32C crc = new CRC32C();
        crc.update(content);
        return crc.getValue();
    }
}
