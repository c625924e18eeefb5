package connate.conductivity;

import connate.formula.Formula;
import connate.method.Constants;
import connate.method.MethodCard;
import connate.method.Range;
import connate.quantity.HydraulicConductivity;
import connate.quantity.Length;
import connate.quantity.Operand;
import connate.quantity.Ratio;
import connate.quantity.Units;
import connate.series.Series;

/**
 * Hazen's rule in its short form.
 *
 * <pre>K [cm/s] = C d10² [cm²]</pre>
 *
 * <p>C is 40 to 80 for very fine or silty sand, 80 to 120 for medium to coarse sand, 120 to 150 for
 * clean coarse sand.
 *
 * <p><b>Valid</b> for d10 from 0.1 to 3 mm and Cu below 5, water at about 10 °C. The size is in
 * centimetres; some guides print factors for millimetres that are ten times too high.
 *
 * <p><b>Source</b>: Hazen (1911), Trans. American Society of Civil Engineers 73, 199–203; factors
 * as in the Groundwater Project's exercises.
 *
 * <p><b>Checked</b> in {@code HazenSimpleTest}.
 */
public final class HazenSimple {

  /** The facts above for {@code help}, the log and the method index. */
  public static final MethodCard CARD =
      MethodCard.named("hazen-simple", "Hazen, short form")
          .equation("K = C d10²")
          .input("d10", "size with 10 % finer", Units.cm, Range.POSITIVE)
          .valid(0.01, 0.3)
          .input("C", "factor", Units.number, Range.POSITIVE)
          .valid(40, 150)
          .result("K", "hydraulic conductivity", Units.cmPerSecond)
          .source("Hazen (1911), Trans. American Society of Civil Engineers 73, 199–203")
          .constants(Constants.CHECKED)
          .topics("hydraulic conductivity", "grain size", "aquifer", "sand")
          .note("Uniformity coefficient below 5; C holds for d10 in cm and K in cm/s.")
          .note("A stormwater guide prints factors for mm/h and mm² ten times too high.")
          .build();

  private static final Formula<HydraulicConductivity> FORMULA =
      Formula.of(CARD, Units.cmPerSecond, HazenSimple::cmPerSecond);

  private HazenSimple() {}

  /** Returns the conductivity of one sand, in m/d. */
  public static HydraulicConductivity of(Length d10, Ratio factor) {
    return FORMULA.value(d10, factor).to(Units.mPerDay);
  }

  /** Returns the conductivity of each row, in m/d. */
  public static Series of(Operand d10, Operand factor) {
    return FORMULA.series(d10, factor).to(Units.mPerDay);
  }

  static double cmPerSecond(double cm, double factor) {
    return factor * cm * cm;
  }
}
