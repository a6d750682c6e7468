package dev.nearlimit.journal;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.UUID;

/**
 * Who holds a claim: one open journal of one process.
 *
 * @param id unlike that of any other owner
 * @param processId the process, by its number
 * @param processes where that number means this process: a running system, or a container on it with numbers of its own
 */
record Owner(String id, long processId, String processes) {
    private static final Path NAMESPACE = Path.of("/proc/self/ns/pid");
    private static final Path BOOT = Path.of("/proc/sys/kernel/random/boot_id");

    static Owner ofThisProcess() {
        return new Owner(UUID.randomUUID().toString(), ProcessHandle.current().pid(), processesSeenHere());
    }

    /** Linux names the namespace and the boot; elsewhere processes are taken for those of one system. */
    private static String processesSeenHere() {
        try {
            return Files.readSymbolicLink(NAMESPACE) + " "
                    + Files.readString(BOOT).strip();
        } catch (IOException | UnsupportedOperationException e) {
            return "system";
        }
    }

    /** Whether the process is surely gone, as far as this process can tell; false where it cannot. */
    boolean isGone(Owner here) {
        return processes.equals(here.processes)
                && !ProcessHandle.of(processId).map(ProcessHandle::isAlive).orElse(false);
    }
}
