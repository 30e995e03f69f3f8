package broadside.cli;

import broadside.assess.About;
import picocli.CommandLine.IVersionProvider;

/** Prints the version of the tool. */
final class VersionText implements IVersionProvider {

    @Override
    public String[] getVersion() {
        return new String[] {"Broadside " + About.of("").version()};
    }
}
