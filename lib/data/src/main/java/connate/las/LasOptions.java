package connate.las;

import java.util.Objects;

/**
 * Answers to the questions that a file may leave open.
 *
 * @param index the mnemonic of the index curve, empty to let the file say
 * @param settingAside true to set rows aside that do not fit, with a caution, where the default is
 *     to refuse the file
 */
public record LasOptions(String index, boolean settingAside) {

  /** The default: the file must be clear. */
  public static final LasOptions STRICT = new LasOptions("", false);

  /** Checks the settings. */
  public LasOptions {
    Objects.requireNonNull(index, "index");
  }

  /** Returns options that name the index curve. */
  public LasOptions withIndex(String mnemonic) {
    return new LasOptions(mnemonic, settingAside);
  }

  /** Returns options that set rows aside that do not fit, each told in a caution. */
  public LasOptions settingRowsAside() {
    return new LasOptions(index, true);
  }
}
