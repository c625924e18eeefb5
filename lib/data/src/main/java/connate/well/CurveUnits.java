package connate.well;

import connate.quantity.Length;
import connate.quantity.Unit;
import connate.quantity.Units;
import connate.role.Role;
import connate.series.Unstated;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;

/** Units as logs spell them. */
final class CurveUnits {

  /** Spellings beyond the aliases of the units themselves; all met in files. */
  private static final Map<String, Unit<?>> SPELLINGS =
      Map.of(
          "decp", Units.fraction,
          "uspf", Units.usPerFt,
          "us/foot", Units.usPerFt,
          "usec/foot", Units.usPerFt,
          "gr/cc", Units.gPerCm3,
          "g/c3", Units.gPerCm3,
          "api units", Units.gAPI);

  private CurveUnits() {}

  /** Returns the unit of a curve, unstated where it has none or none that is known. */
  static Unit<?> of(String symbol, Role role) {
    if (symbol.isBlank()) {
      return Unstated.UNIT;
    }
    Unit<?> spelled = SPELLINGS.get(symbol.toLowerCase(Locale.ROOT));
    if (spelled != null) {
      return spelled;
    }
    Optional<Unit<?>> byRole = role == null ? Optional.empty() : role.unit(symbol);
    return byRole.or(() -> Unit.find(symbol)).orElse(Unstated.UNIT);
  }

  /** Returns the unit of a depth, empty where it is no length. */
  static Optional<Unit<?>> depth(String symbol) {
    return Length.DIMENSION.find(symbol).map(u -> u);
  }
}
