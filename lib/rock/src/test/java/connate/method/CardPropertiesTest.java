package connate.method;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import connate.checks.Seeds;
import connate.quantity.Operand;
import connate.quantity.Quantity;
import connate.quantity.Unit;
import connate.quantity.Units;
import connate.series.Series;
import java.lang.reflect.InvocationTargetException;
import java.lang.reflect.Method;
import java.lang.reflect.Modifier;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Random;
import org.junit.jupiter.api.DynamicTest;
import org.junit.jupiter.api.TestFactory;

/**
 * Every pair of a typed form and a column form of the catalogue, found by reflection: the column
 * gives what the single value gives, and another unit of the same input changes nothing.
 */
class CardPropertiesTest {

  @TestFactory
  List<DynamicTest> columnEqualsValueInAnyUnit() throws Exception {
    List<DynamicTest> tests = new ArrayList<>();
    for (String name : MethodCards.classes()) {
      for (Method typed : Class.forName(name).getMethods()) {
        Method column = columnOf(typed);
        if (column != null) {
          String label = name + "." + typed.getName() + "/" + typed.getParameterCount();
          tests.add(DynamicTest.dynamicTest(label, () -> compare(label, typed, column)));
        }
      }
    }
    assertTrue(tests.size() > 100, "pairs found: " + tests.size());
    return tests;
  }

  private static Method columnOf(Method typed) {
    Class<?>[] inputs = typed.getParameterTypes();
    boolean pure =
        Modifier.isStatic(typed.getModifiers())
            && inputs.length > 0
            && Quantity.class.isAssignableFrom(typed.getReturnType())
            && Arrays.stream(inputs).allMatch(Quantity.class::isAssignableFrom);
    if (!pure) {
      return null;
    }
    Class<?>[] operands = new Class<?>[inputs.length];
    Arrays.fill(operands, Operand.class);
    try {
      return typed.getDeclaringClass().getMethod(typed.getName(), operands);
    } catch (NoSuchMethodException e) {
      return null;
    }
  }

  private static void compare(String label, Method typed, Method column) throws Exception {
    Random random = Seeds.random(label);
    int compared = 0;
    for (int run = 0; run < 400 && compared < 20; run++) {
      Quantity<?>[] in = new Quantity<?>[typed.getParameterCount()];
      for (int i = 0; i < in.length; i++) {
        in[i] = any(random, typed.getParameterTypes()[i]);
      }
      Quantity<?> one = call(typed, (Object[]) in);
      if (one != null && Double.isFinite(one.si())) {
        compared++;
        for (int i = 0; i < in.length; i++) {
          checkColumn(label, column, one, in, i);
        }
      }
    }
    assertTrue(compared > 0, label + ": no possible inputs were found");
  }

  /** Puts input i into a column in every unit of its dimension, the others stay. */
  private static void checkColumn(
      String label, Method column, Quantity<?> one, Quantity<?>[] in, int i) throws Exception {
    for (Unit<?> unit : in[i].unit().dimension().units()) {
      Object[] operands = Arrays.copyOf(in, in.length, Object[].class);
      double number = in[i].unit().convert(in[i].number(), unit);
      operands[i] = Series.of("x", unit, number, Double.NaN);
      Series rows = (Series) column.invoke(null, operands);
      double found = rows.unit().toSi(rows.value(0));
      double tolerance = 1e-6 * Math.abs(one.si()) + 1e-9 * one.unit().toSi(1);
      assertEquals(one.si(), found, tolerance, label + ", input " + i + " in " + unit);
      assertTrue(Double.isNaN(rows.value(1)), label + ": a missing row stays missing");
    }
  }

  private static Quantity<?> call(Method typed, Object... in) throws IllegalAccessException {
    try {
      return (Quantity<?>) typed.invoke(null, in);
    } catch (InvocationTargetException e) {
      assertTrue(e.getCause() instanceof IllegalArgumentException, e.getCause().toString());
      return null;
    }
  }

  /** Returns a quantity such as the trade meets. */
  private static Quantity<?> any(Random random, Class<?> type) {
    return switch (type.getSimpleName()) {
      case "Length" -> Units.mm(StrictMath.exp(Seeds.between(random, -3, 15)));
      case "Fraction" -> Units.fraction(Seeds.between(random, 0.01, 0.7));
      case "Temperature" -> Units.degC(Seeds.between(random, 1, 99));
      case "Ratio" -> Units.number(Seeds.between(random, -1, 4));
      case "Time" -> Units.Ma(Seeds.between(random, 1, 100));
      case "Pressure" -> Units.MPa(Seeds.between(random, 1, 60));
      case "Permeability" -> Units.mD(Seeds.between(random, 1, 900));
      case "HydraulicConductivity" -> Units.mPerDay(Seeds.between(random, 0.1, 50));
      case "Viscosity" -> Units.cP(Seeds.between(random, 0.3, 2));
      case "Density" -> Units.gPerCm3(Seeds.between(random, 0.9, 3));
      case "Slowness" -> Units.usPerFt(Seeds.between(random, 56, 180));
      case "SpecificSurface" -> Units.perUm(Seeds.between(random, 0.001, 1));
      case "ThermalGradient" -> Units.degCPerKm(Seeds.between(random, 10, 50));
      case "Resistivity" -> Units.ohmM(Seeds.between(random, 0.05, 100));
      case "GammaRay" -> Units.gAPI(Seeds.between(random, 1, 200));
      case "InterfacialTension" -> Units.mNPerM(Seeds.between(random, 20, 480));
      case "Compressibility" -> Units.perMPa(Seeds.between(random, 0.0001, 0.01));
      case "Area" -> Units.cm2(Seeds.between(random, 1, 30));
      case "Volume" -> Units.cm3(Seeds.between(random, 1, 30));
      case "Rate" -> Units.m3PerDay(Seeds.between(random, 0.1, 900));
      case "Transmissivity" -> Units.m2PerDay(Seeds.between(random, 1, 900));
      case "Velocity" -> Units.kmPerSecond(Seeds.between(random, 1.5, 6));
      case "Angle" -> Units.degrees(Seeds.between(random, 1, 89));
      case "PressureGradient" -> Units.MPaPerKm(Seeds.between(random, 1, 30));
      default -> throw new IllegalStateException("no example of a " + type.getSimpleName());
    };
  }
}
