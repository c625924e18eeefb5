package connate.record;

/** The version of this program. */
public final class Versions {

  private Versions() {}

  /** Returns the version of Connate. */
  public static String connate() {
    String version = Versions.class.getPackage().getImplementationVersion();
    return version == null ? "unreleased" : version;
  }
}
