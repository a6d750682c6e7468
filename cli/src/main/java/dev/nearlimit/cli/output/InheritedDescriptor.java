package dev.nearlimit.cli.output;

import java.io.FileDescriptor;
import java.lang.reflect.Constructor;
import java.util.Optional;

/**
 * An open file that the launcher hands over by its number. Opening it anew by a path would not do: a file has a place to
 * write at, which whoever inherits it must share.
 */
final class InheritedDescriptor {
    private InheritedDescriptor() {}

    /**
     * The descriptor whose number a system property gives; empty where there is none, or where the JVM does not let it be
     * used (the jar's manifest asks for it with {@code Add-Opens}).
     */
    static Optional<FileDescriptor> named(String property) {
        Integer number = Integer.getInteger(property);
        if (number == null) {
            return Optional.empty();
        }
        try {
            Constructor<FileDescriptor> constructor = FileDescriptor.class.getDeclaredConstructor(int.class);
            constructor.setAccessible(true);
            FileDescriptor descriptor = constructor.newInstance(number);
            return descriptor.valid() ? Optional.of(descriptor) : Optional.empty();
        } catch (ReflectiveOperationException | RuntimeException e) {
            return Optional.empty();
        }
    }
}
