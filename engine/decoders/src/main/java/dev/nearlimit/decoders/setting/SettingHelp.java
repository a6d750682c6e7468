package dev.nearlimit.decoders.setting;

/**
 * One line of help about a setting.
 *
 * @param name the key before the equals sign
 * @param form what may follow it, such as {@code 1..1000} or {@code layered|flooding}
 * @param standard what holds when the setting is not given
 * @param meaning what it does, with its unit
 */
public record SettingHelp(String name, String form, String standard, String meaning) {
    /** As {@code iterations=1..1000 (20): meaning}. */
    @Override
    public String toString() {
        return name + "=" + form + " (" + standard + "): " + meaning;
    }
}
