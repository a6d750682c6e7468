package dev.nearlimit.cli;

import dev.nearlimit.numerics.kernels.Kernels;
import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.util.Properties;
import picocli.CommandLine.IVersionProvider;

/** What {@code --version} prints: this tool, the JVM and the kernels in use, which together explain a measured speed. */
public final class VersionText implements IVersionProvider {
    @Override
    public String[] getVersion() {
        return new String[] {"nearlimit " + toolVersion(), "jvm: " + jvm(), "kernels: " + kernels()};
    }

    public static String toolVersion() {
        try (InputStream in = VersionText.class.getResourceAsStream("version.properties")) {
            Properties properties = new Properties();
            properties.load(in);
            return properties.getProperty("version");
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    /** Name and version of the JVM. */
    public static String jvm() {
        return System.getProperty("java.vm.name") + " " + Runtime.version();
    }

    /** Which kernels do the arithmetic. */
    public static String kernels() {
        return Kernels.name();
    }
}
