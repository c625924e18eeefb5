package connate.table;

import connate.fault.DataException;
import connate.fault.Fault;
import java.util.ArrayList;
import java.util.List;
import java.util.function.Supplier;

/** Counts what is wrong with a table and keeps the first faults, which are told together. */
final class Faults {

  private final List<Fault> first = new ArrayList<>();
  private int total;

  void add(Supplier<Fault> fault) {
    total++;
    if (first.size() < DataException.SHOWN) {
      first.add(fault.get());
    }
  }

  void throwAny() {
    if (total > 0) {
      throw new DataException(first, total);
    }
  }
}
