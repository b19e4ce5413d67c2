package coilwright.cli;

import picocli.CommandLine;

/** The program's version, from its jar. */
final class Version implements CommandLine.IVersionProvider {

  @Override
  public String[] getVersion() {
    String version = Version.class.getPackage().getImplementationVersion();
    return new String[] {"coilwright " + (version == null ? "unpackaged" : version)};
  }
}
