package connate.table;

import connate.role.Role;
import connate.series.Series;
import java.util.Locale;
import java.util.Optional;
import java.util.Set;

/**
 * What a column's name says of how it was measured: {@code k_air} and {@code k_liquid} are not the
 * same thing, nor are porosities at ambient and at in-situ stress. Methods look at these traits.
 */
final class NameTraits {

  private static final Set<String> STRESSED = Set.of("permeability", "porosity");

  private NameTraits() {}

  static Series of(Series series, Optional<Role> role) {
    String name = letters(series.name());
    String of = role.map(Role::name).orElse("");
    Series out = series;
    if (of.equals("permeability")) {
      String fluid = fluid(name);
      out = fluid.isEmpty() ? out : out.with(Series.FLUID, fluid);
    }
    if (STRESSED.contains(of)) {
      String stress = stress(name);
      out = stress.isEmpty() ? out : out.with(Series.STRESS, stress);
    }
    return out;
  }

  private static String fluid(String name) {
    if (name.contains("brine") || name.contains("water")) {
      return "brine";
    }
    if (name.contains("liq") || name.contains("klink") || name.equals("kl")) {
      return "liquid";
    }
    return name.contains("air") || name.contains("gas") ? "air" : "";
  }

  private static String stress(String name) {
    if (name.contains("insitu") || name.contains("overburden")) {
      return "in situ";
    }
    return name.contains("ambient") ? "ambient" : "";
  }

  private static String letters(String name) {
    return name.toLowerCase(Locale.ROOT).replaceAll("[^a-z]", "");
  }
}
