package connate.fault;

import java.util.List;

/** Bad input data, with the places. The message is ready to be read by the user. */
public final class DataException extends RuntimeException {

  /** The largest number of faults that one message tells. */
  public static final int SHOWN = 20;

  private static final long serialVersionUID = 1L;

  private final transient List<Fault> faults;

  /** Makes an exception of one fault. */
  public DataException(Fault fault) {
    this(List.of(fault), 1);
  }

  /**
   * Makes an exception of several faults of one input.
   *
   * @param faults the faults, of which the first {@value #SHOWN} are told
   * @param total the number found, which may be larger than the list
   */
  public DataException(List<Fault> faults, int total) {
    super(message(faults, total));
    this.faults = List.copyOf(faults);
  }

  /** Returns the faults with their places. */
  public List<Fault> faults() {
    return faults == null ? List.of() : faults;
  }

  private static String message(List<Fault> faults, int total) {
    if (faults.isEmpty()) {
      throw new IllegalArgumentException("a data exception needs a fault");
    }
    StringBuilder out = new StringBuilder();
    int shown = Math.min(SHOWN, faults.size());
    for (Fault fault : faults.subList(0, shown)) {
      out.append(out.length() == 0 ? "" : "\n").append(fault);
    }
    if (total > shown) {
      out.append("\nand ").append(total - shown).append(" more of this kind");
    }
    return out.toString();
  }
}
