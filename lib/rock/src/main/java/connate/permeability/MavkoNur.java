package connate.permeability;

import connate.formula.Formula;
import connate.method.Constants;
import connate.method.MethodCard;
import connate.method.Range;
import connate.quantity.Fraction;
import connate.quantity.Length;
import connate.quantity.Operand;
import connate.quantity.Permeability;
import connate.quantity.Units;
import connate.series.Series;

/**
 * Permeability of a bed whose pores conduct only above a percolation porosity, after Mavko and Nur.
 *
 * <pre>
 * k = (φ − φc)³ d² / (180 (1 + φc − φ)²)
 * </pre>
 *
 * <table>
 * <caption>Symbols</caption>
 * <tr><th>symbol</th><th>meaning</th><th>unit</th></tr>
 * <tr><td>k</td><td>permeability</td><td>m²</td></tr>
 * <tr><td>φ</td><td>porosity</td><td>1</td></tr>
 * <tr><td>φc</td><td>percolation porosity, 0.01 to 0.05, often 0.025</td><td>1</td></tr>
 * <tr><td>d</td><td>grain diameter</td><td>m</td></tr>
 * </table>
 *
 * <p><b>Valid</b> for clean sands and sandstones; below φc nothing flows.
 *
 * <p><b>Source</b>: Mavko and Nur (1997), Geophysics 62, 1480–1482; constants from memory.
 *
 * <p><b>Checked</b> in {@code PermeabilityLawsTest}.
 */
public final class MavkoNur {

  /** The facts on the law of Mavko and Nur. */
  public static final MethodCard CARD =
      MethodCard.named("mavko-nur", "Mavko–Nur")
          .equation("k = (φ - φc)³ d² / (180 (1 + φc - φ)²)")
          .input("φ", "porosity", Units.fraction, Range.from(0).below(1))
          .input("φc", "percolation porosity", Units.fraction, Range.from(0).below(1))
          .valid(0.005, 0.06)
          .input("d", "grain diameter", Units.m, Range.POSITIVE)
          .result("k", "permeability", Units.squareMetres)
          .source("Mavko and Nur (1997), Geophysics 62, 1480–1482")
          .constants(Constants.FROM_MEMORY)
          .topics("permeability", "porosity", "grain size", "sandstone")
          .note("Below the percolation porosity nothing flows.")
          .build();

  private static final Formula<Permeability> CARD_FORMULA =
      Formula.of(
          CARD, Units.squareMetres, (phi, critical, d) -> MavkoNur.ofNumber(phi, critical, d));

  private MavkoNur() {}

  /** Returns the permeability of one sample by the law of Mavko and Nur. */
  public static Permeability of(
      Fraction porosity, Fraction percolationPorosity, Length grainDiameter) {
    return CARD_FORMULA.value(porosity, percolationPorosity, grainDiameter);
  }

  /** Returns the permeability of each row by the law of Mavko and Nur. */
  public static Series of(Operand porosity, Operand percolationPorosity, Operand grainDiameter) {
    return CARD_FORMULA.series(porosity, percolationPorosity, grainDiameter);
  }

  static double ofNumber(double phi, double critical, double d) {
    double open = StrictMath.max(0, phi - critical);
    double solid = 1 - open;
    return open * open * open * d * d / (180 * solid * solid);
  }
}
