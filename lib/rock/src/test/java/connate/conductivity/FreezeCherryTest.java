package connate.conductivity;

import static connate.quantity.Units.darcy;
import static connate.quantity.Units.degC;
import static connate.quantity.Units.mD;
import static connate.quantity.Units.mPerDay;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import connate.checks.Check;
import connate.checks.Kind;
import connate.quantity.Units;
import org.junit.jupiter.api.Test;

class FreezeCherryTest {

  /**
   * Independent: the packed clean sands of Beard and Weyl (1973), measured from 1.1 to 475 darcy,
   * and a cemented sandstone of 10 mD must fall into their bars.
   */
  @Test
  @Check(
      method = "freeze-cherry",
      kind = Kind.INDEPENDENT,
      source = "permeability of packed sand, Beard and Weyl (1973)")
  void packedSands() {
    assertTrue(FreezeCherry.CLEAN_SAND.holds(Conductivity.of(darcy(475), degC(20))));
    assertTrue(FreezeCherry.CLEAN_SAND.holds(Conductivity.of(darcy(1.1), degC(20))));
    assertTrue(FreezeCherry.SANDSTONE.holds(Conductivity.of(mD(10), degC(20))));
    assertFalse(FreezeCherry.SANDSTONE.holds(Conductivity.of(darcy(475), degC(20))));
    assertTrue(FreezeCherry.of(mPerDay(20)).contains(FreezeCherry.CLEAN_SAND));
    assertFalse(FreezeCherry.of(mPerDay(20)).contains(FreezeCherry.SHALE));
  }

  @Test
  void range() {
    assertEquals(1e-4, FreezeCherry.CLEAN_SAND.range().value().in(Units.mPerSecond), 1e-12);
    assertEquals("clean sand", FreezeCherry.CLEAN_SAND.toString());
  }
}
