package shuntwright.planner.command;

import java.io.IOException;
import java.io.InputStream;
import java.util.Objects;
import java.util.Properties;

import picocli.CommandLine.IVersionProvider;

/** The version that the build wrote beside this class. */
final class Version implements IVersionProvider {
    @Override
    public String[] getVersion() throws IOException {
        Properties properties = new Properties();
        try (InputStream in = Objects.requireNonNull(Version.class.getResourceAsStream("version.properties"))) {
            properties.load(in);
        }
        return new String[]{"Shuntwright " + properties.getProperty("version") + ", Java " + Runtime.version()};
    }
}
