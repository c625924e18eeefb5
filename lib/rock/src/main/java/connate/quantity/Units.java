package connate.quantity;

/**
 * The units of the trade, each as a constant to convert with and as a function to make a quantity:
 * {@code mD(250).in(darcy)}. Meant to be imported statically.
 *
 * <p>Exact factors: foot 0.3048 m, inch 25.4 mm, barrel 42 US gallons of 231 cubic inches, pound
 * force per square inch from the avoirdupois pound and standard gravity, standard atmosphere 101325
 * Pa (NIST SP 811, appendix B). The darcy is 1 cP·cm²/(s·atm), that is 1e-7/101325 m². A year is
 * the Julian year of 365.25 days.
 */
public final class Units {

  /** One darcy in square metres: 1 cP · 1 cm² / (1 s · 1 atm). */
  public static final double DARCY = 1e-7 / 101325;

  private static final double SECONDS_PER_YEAR = 365.25 * 86400;
  private static final double RADIANS_PER_DEGREE = StrictMath.PI / 180;

  /** The unit m of Length. */
  public static final Unit<Length> m =
      Length.DIMENSION.unit("m", 1, 0, "metre", "meter", "metres", "meters", "mtr", "METER");

  /** The unit km of Length. */
  public static final Unit<Length> km =
      Length.DIMENSION.unit("km", 1000, 0, "kilometre", "kilometres", "kilometer");

  /** The unit cm of Length. */
  public static final Unit<Length> cm = Length.DIMENSION.unit("cm", 0.01, 0, "centimetre");

  /** The unit mm of Length. */
  public static final Unit<Length> mm = Length.DIMENSION.unit("mm", 0.001, 0, "millimetre");

  /** The unit µm of Length. */
  public static final Unit<Length> um =
      Length.DIMENSION.unit(
          "µm", 1e-6, 0, "um", "μm", "micron", "microns", "micrometre", "micrometer");

  /** The unit nm of Length. */
  public static final Unit<Length> nm = Length.DIMENSION.unit("nm", 1e-9, 0, "nanometre");

  /** The unit ft of Length. */
  public static final Unit<Length> ft = Length.DIMENSION.unit("ft", 0.3048, 0, "f", "feet", "foot");

  /** The unit in of Length. */
  public static final Unit<Length> inches =
      Length.DIMENSION.unit("in", 0.0254, 0, "inch", "inches");

  /** The unit .1in of Length. */
  public static final Unit<Length> tenthInches = Length.DIMENSION.unit(".1in", 0.00254, 0, "0.1in");

  /** The unit m² of Area. */
  public static final Unit<Area> m2 = Area.DIMENSION.unit("m²", 1, 0, "m2", "sqm");

  /** The unit km² of Area. */
  public static final Unit<Area> km2 = Area.DIMENSION.unit("km²", 1e6, 0, "km2");

  /** The unit cm² of Area. */
  public static final Unit<Area> cm2 = Area.DIMENSION.unit("cm²", 1e-4, 0, "cm2");

  /** The unit ft² of Area. */
  public static final Unit<Area> ft2 = Area.DIMENSION.unit("ft²", 0.09290304, 0, "ft2", "sqft");

  /** The unit m³ of Volume. */
  public static final Unit<Volume> m3 = Volume.DIMENSION.unit("m³", 1, 0, "m3", "cubm");

  /** The unit cm³ of Volume. */
  public static final Unit<Volume> cm3 = Volume.DIMENSION.unit("cm³", 1e-6, 0, "cm3", "cc", "ml");

  /** The unit L of Volume. */
  public static final Unit<Volume> litres =
      Volume.DIMENSION.unit("L", 1e-3, 0, "l", "litre", "litres", "liter");

  /** The unit bbl of Volume. */
  public static final Unit<Volume> bbl =
      Volume.DIMENSION.unit("bbl", 0.158987294928, 0, "barrel", "barrels");

  /** The unit ft³ of Volume. */
  public static final Unit<Volume> ft3 =
      Volume.DIMENSION.unit("ft³", 0.028316846592, 0, "ft3", "cuft");

  /** The unit s of Time. */
  public static final Unit<Time> s = Time.DIMENSION.unit("s", 1, 0, "sec", "second", "seconds");

  /** The unit ms of Time. */
  public static final Unit<Time> ms =
      Time.DIMENSION.unit("ms", 0.001, 0, "msec", "millisecond", "milliseconds");

  /** The unit min of Time. */
  public static final Unit<Time> minutes = Time.DIMENSION.unit("min", 60, 0, "minute", "minutes");

  /** The unit h of Time. */
  public static final Unit<Time> hours = Time.DIMENSION.unit("h", 3600, 0, "hr", "hour", "hours");

  /** The unit d of Time. */
  public static final Unit<Time> days = Time.DIMENSION.unit("d", 86400, 0, "day", "days");

  /** The unit yr of Time. */
  public static final Unit<Time> years =
      Time.DIMENSION.unit("yr", SECONDS_PER_YEAR, 0, "a", "year", "years");

  /** The unit Ma of Time. */
  public static final Unit<Time> Ma =
      Time.DIMENSION.unit("Ma", 1e6 * SECONDS_PER_YEAR, 0, "my", "myr");

  /** The unit Pa of Pressure. */
  public static final Unit<Pressure> Pa = Pressure.DIMENSION.unit("Pa", 1, 0, "pascal");

  /** The unit kPa of Pressure. */
  public static final Unit<Pressure> kPa = Pressure.DIMENSION.unit("kPa", 1e3, 0, "kpaa");

  /** The unit MPa of Pressure. */
  public static final Unit<Pressure> MPa = Pressure.DIMENSION.unit("MPa", 1e6, 0, "mpaa");

  /** The unit GPa of Pressure. */
  public static final Unit<Pressure> GPa = Pressure.DIMENSION.unit("GPa", 1e9, 0);

  /** The unit bar of Pressure. */
  public static final Unit<Pressure> bar = Pressure.DIMENSION.unit("bar", 1e5, 0, "bara", "bars");

  /** The unit psi of Pressure. */
  public static final Unit<Pressure> psi =
      Pressure.DIMENSION.unit("psi", 6894.757293168361, 0, "psia", "lbf/in2");

  /** The unit atm of Pressure. */
  public static final Unit<Pressure> atm = Pressure.DIMENSION.unit("atm", 101325, 0, "atmosphere");

  /** The unit K of Temperature. */
  public static final Unit<Temperature> K = Temperature.DIMENSION.unit("K", 1, 0, "kelvin", "degk");

  /** The unit °C of Temperature. */
  public static final Unit<Temperature> degC =
      Temperature.DIMENSION.unit("°C", 1, 273.15, "degc", "deg.c", "c", "celsius");

  /** The unit °F of Temperature. */
  public static final Unit<Temperature> degF =
      Temperature.DIMENSION.unit("°F", 5.0 / 9.0, 459.67, "degf", "deg.f", "fahrenheit", "f");

  /** The unit Pa·s of Viscosity. */
  public static final Unit<Viscosity> PaS = Viscosity.DIMENSION.unit("Pa·s", 1, 0, "pa.s", "pas");

  /** The unit mPa·s of Viscosity. */
  public static final Unit<Viscosity> mPaS =
      Viscosity.DIMENSION.unit("mPa·s", 1e-3, 0, "mpa.s", "mpas");

  /** The unit cP of Viscosity. */
  public static final Unit<Viscosity> cP =
      Viscosity.DIMENSION.unit("cP", 1e-3, 0, "cp", "centipoise");

  /** The unit kg/m³ of Density. */
  public static final Unit<Density> kgPerM3 =
      Density.DIMENSION.unit("kg/m³", 1, 0, "kg/m3", "k/m3", "kgm3", "kg/cubm");

  /** The unit g/cm³ of Density. */
  public static final Unit<Density> gPerCm3 =
      Density.DIMENSION.unit(
          "g/cm³", 1000, 0, "g/cm3", "g/cc", "gm/cc", "g/c3", "gcc", "gm/c3", "gm/cm3", "g/ml");

  /** The unit lb/ft³ of Density. */
  public static final Unit<Density> lbPerFt3 =
      Density.DIMENSION.unit("lb/ft³", 16.018463373960142, 0, "lb/ft3", "lbm/ft3");

  /** The unit m² of Permeability. */
  public static final Unit<Permeability> squareMetres =
      Permeability.DIMENSION.unit("m²", 1, 0, "m2", "sqm");

  /** The unit µm² of Permeability. */
  public static final Unit<Permeability> um2 =
      Permeability.DIMENSION.unit("µm²", 1e-12, 0, "um2", "μm2", "μm²", "micron2");

  /** The unit cm² of Permeability. */
  public static final Unit<Permeability> squareCentimetres =
      Permeability.DIMENSION.unit("cm²", 1e-4, 0, "cm2");

  /** The unit D of Permeability. */
  public static final Unit<Permeability> darcy =
      Permeability.DIMENSION.unit("D", DARCY, 0, "darcy", "darcies");

  /** The unit mD of Permeability. */
  public static final Unit<Permeability> mD =
      Permeability.DIMENSION.unit("mD", 1e-3 * DARCY, 0, "md", "millidarcy", "millidarcies");

  /** The unit µD of Permeability. */
  public static final Unit<Permeability> uD =
      Permeability.DIMENSION.unit("µD", 1e-6 * DARCY, 0, "ud", "μd", "microdarcy");

  /** The unit nD of Permeability. */
  public static final Unit<Permeability> nD =
      Permeability.DIMENSION.unit("nD", 1e-9 * DARCY, 0, "nanodarcy");

  /** The unit mD·m of PermeabilityThickness. */
  public static final Unit<PermeabilityThickness> mDm =
      PermeabilityThickness.DIMENSION.unit("mD·m", 1e-3 * DARCY, 0, "md.m", "md-m", "mdm");

  /** The unit mD·ft of PermeabilityThickness. */
  public static final Unit<PermeabilityThickness> mDft =
      PermeabilityThickness.DIMENSION.unit(
          "mD·ft", 1e-3 * DARCY * 0.3048, 0, "md.ft", "md-ft", "mdft");

  /** The unit m³ of PermeabilityThickness. */
  public static final Unit<PermeabilityThickness> kh =
      PermeabilityThickness.DIMENSION.unit("m³", 1, 0, "m3");

  /** The unit m/s of HydraulicConductivity. */
  public static final Unit<HydraulicConductivity> mPerSecond =
      HydraulicConductivity.DIMENSION.unit("m/s", 1, 0, "mps");

  /** The unit m/d of HydraulicConductivity. */
  public static final Unit<HydraulicConductivity> mPerDay =
      HydraulicConductivity.DIMENSION.unit("m/d", 1.0 / 86400, 0, "m/day");

  /** The unit cm/s of HydraulicConductivity. */
  public static final Unit<HydraulicConductivity> cmPerSecond =
      HydraulicConductivity.DIMENSION.unit("cm/s", 0.01, 0, "cm/sec");

  /** The unit ft/d of HydraulicConductivity. */
  public static final Unit<HydraulicConductivity> ftPerDay =
      HydraulicConductivity.DIMENSION.unit("ft/d", 0.3048 / 86400, 0, "ft/day");

  /** The unit m²/s of Transmissivity. */
  public static final Unit<Transmissivity> m2PerSecond =
      Transmissivity.DIMENSION.unit("m²/s", 1, 0, "m2/s");

  /** The unit m²/d of Transmissivity. */
  public static final Unit<Transmissivity> m2PerDay =
      Transmissivity.DIMENSION.unit("m²/d", 1.0 / 86400, 0, "m2/d", "m2/day");

  /** The unit ft²/d of Transmissivity. */
  public static final Unit<Transmissivity> ft2PerDay =
      Transmissivity.DIMENSION.unit("ft²/d", 0.09290304 / 86400, 0, "ft2/d", "ft2/day");

  /** The unit m³/s of Rate. */
  public static final Unit<Rate> m3PerSecond = Rate.DIMENSION.unit("m³/s", 1, 0, "m3/s");

  /** The unit m³/d of Rate. */
  public static final Unit<Rate> m3PerDay =
      Rate.DIMENSION.unit("m³/d", 1.0 / 86400, 0, "m3/d", "m3/day", "sm3/d");

  /** The unit m³/h of Rate. */
  public static final Unit<Rate> m3PerHour =
      Rate.DIMENSION.unit("m³/h", 1.0 / 3600, 0, "m3/h", "m3/hr");

  /** The unit L/s of Rate. */
  public static final Unit<Rate> litresPerSecond = Rate.DIMENSION.unit("L/s", 1e-3, 0, "l/s");

  /** The unit cm³/s of Rate. */
  public static final Unit<Rate> cm3PerSecond =
      Rate.DIMENSION.unit("cm³/s", 1e-6, 0, "cm3/s", "cc/s", "ml/s");

  /** The unit bbl/d of Rate. */
  public static final Unit<Rate> bblPerDay =
      Rate.DIMENSION.unit("bbl/d", 0.158987294928 / 86400, 0, "bbl/day", "stb/d", "bpd");

  /** The unit ft³/d of Rate. */
  public static final Unit<Rate> ft3PerDay =
      Rate.DIMENSION.unit("ft³/d", 0.028316846592 / 86400, 0, "ft3/d");

  /** The unit m/s of Velocity. */
  public static final Unit<Velocity> metresPerSecond =
      Velocity.DIMENSION.unit("m/s", 1, 0, "m/sec");

  /** The unit km/s of Velocity. */
  public static final Unit<Velocity> kmPerSecond =
      Velocity.DIMENSION.unit("km/s", 1000, 0, "km/sec");

  /** The unit ft/s of Velocity. */
  public static final Unit<Velocity> ftPerSecond =
      Velocity.DIMENSION.unit("ft/s", 0.3048, 0, "ft/sec");

  /** The unit m/yr of Velocity. */
  public static final Unit<Velocity> mPerYear =
      Velocity.DIMENSION.unit("m/yr", 1.0 / SECONDS_PER_YEAR, 0, "m/a", "m/year");

  /** The unit rad of Angle. */
  public static final Unit<Angle> radians = Angle.DIMENSION.unit("rad", 1, 0, "radian", "radians");

  /** The unit ° of Angle. */
  public static final Unit<Angle> degrees =
      Angle.DIMENSION.unit("°", RADIANS_PER_DEGREE, 0, "deg", "degree", "degrees", "dega");

  /** The unit N/m of InterfacialTension. */
  public static final Unit<InterfacialTension> NPerM =
      InterfacialTension.DIMENSION.unit("N/m", 1, 0);

  /** The unit mN/m of InterfacialTension. */
  public static final Unit<InterfacialTension> mNPerM =
      InterfacialTension.DIMENSION.unit("mN/m", 1e-3, 0, "mn/m", "dyn/cm", "dyne/cm", "dynes/cm");

  /** The unit fraction of Fraction. */
  public static final Unit<Fraction> fraction =
      Fraction.DIMENSION.unit(
          "fraction",
          1,
          0,
          "v/v",
          "frac",
          "dec",
          "decimal",
          "m3/m3",
          "ft3/ft3",
          "cfcf",
          "g/g",
          "pu/100");

  /** The unit % of Fraction. */
  public static final Unit<Fraction> percent =
      Fraction.DIMENSION.unit("%", 0.01, 0, "pct", "percent", "p.u.", "pu", "vol%", "wt%");

  /** The unit ppm of Fraction. */
  public static final Unit<Fraction> ppm = Fraction.DIMENSION.unit("ppm", 1e-6, 0);

  /** The unit 1 of Ratio. */
  public static final Unit<Ratio> number =
      Ratio.DIMENSION.unit("1", 1, 0, "number", "unitless", "dimensionless");

  /** The unit decades of Ratio. */
  public static final Unit<Ratio> decades = Ratio.DIMENSION.unit("decades", 1, 0, "decade");

  /** The unit s/m of Slowness. */
  public static final Unit<Slowness> sPerM = Slowness.DIMENSION.unit("s/m", 1, 0);

  /** The unit µs/ft of Slowness. */
  public static final Unit<Slowness> usPerFt =
      Slowness.DIMENSION.unit(
          "µs/ft", 1e-6 / 0.3048, 0, "us/ft", "μs/ft", "usec/ft", "us/f", "usft");

  /** The unit µs/m of Slowness. */
  public static final Unit<Slowness> usPerM =
      Slowness.DIMENSION.unit("µs/m", 1e-6, 0, "us/m", "μs/m", "usec/m");

  /** The unit ohm·m of Resistivity. */
  public static final Unit<Resistivity> ohmM =
      Resistivity.DIMENSION.unit(
          "ohm·m", 1, 0, "ohm.m", "ohmm", "ohm-m", "ohm/m", "ohms", "ohm.m²/m", "ohm.m2/m", "Ω·m");

  /** The unit gAPI of GammaRay. */
  public static final Unit<GammaRay> gAPI =
      GammaRay.DIMENSION.unit("gAPI", 1, 0, "gapi", "api", "aapi", "api-gr", "apigr");

  /** The unit 1/Pa of Compressibility. */
  public static final Unit<Compressibility> perPa =
      Compressibility.DIMENSION.unit("1/Pa", 1, 0, "pa-1");

  /** The unit 1/MPa of Compressibility. */
  public static final Unit<Compressibility> perMPa =
      Compressibility.DIMENSION.unit("1/MPa", 1e-6, 0);

  /** The unit 1/psi of Compressibility. */
  public static final Unit<Compressibility> perPsi =
      Compressibility.DIMENSION.unit("1/psi", 1 / 6894.757293168361, 0, "psi-1");

  /** The unit K/m of ThermalGradient. */
  public static final Unit<ThermalGradient> KPerM =
      ThermalGradient.DIMENSION.unit("K/m", 1, 0, "degc/m", "°c/m");

  /** The unit °C/km of ThermalGradient. */
  public static final Unit<ThermalGradient> degCPerKm =
      ThermalGradient.DIMENSION.unit("°C/km", 1e-3, 0, "degc/km", "k/km");

  /** The unit Pa/m of PressureGradient. */
  public static final Unit<PressureGradient> PaPerM = PressureGradient.DIMENSION.unit("Pa/m", 1, 0);

  /** The unit psi/ft of PressureGradient. */
  public static final Unit<PressureGradient> psiPerFt =
      PressureGradient.DIMENSION.unit("psi/ft", 6894.757293168361 / 0.3048, 0);

  /** The unit bar/m of PressureGradient. */
  public static final Unit<PressureGradient> barPerM =
      PressureGradient.DIMENSION.unit("bar/m", 1e5, 0);

  /** The unit MPa/km of PressureGradient. */
  public static final Unit<PressureGradient> MPaPerKm =
      PressureGradient.DIMENSION.unit("MPa/km", 1e3, 0);

  /** The unit 1/m of SpecificSurface. */
  public static final Unit<SpecificSurface> perM =
      SpecificSurface.DIMENSION.unit("1/m", 1, 0, "m-1");

  /** The unit 1/cm of SpecificSurface. */
  public static final Unit<SpecificSurface> perCm =
      SpecificSurface.DIMENSION.unit("1/cm", 100, 0, "cm-1");

  /** The unit 1/µm of SpecificSurface. */
  public static final Unit<SpecificSurface> perUm =
      SpecificSurface.DIMENSION.unit("1/µm", 1e6, 0, "1/um");

  private Units() {}

  /** Returns so many m. */
  public static Length m(double value) {
    return Length.of(value, m);
  }

  /** Returns so many km. */
  public static Length km(double value) {
    return Length.of(value, km);
  }

  /** Returns so many cm. */
  public static Length cm(double value) {
    return Length.of(value, cm);
  }

  /** Returns so many mm. */
  public static Length mm(double value) {
    return Length.of(value, mm);
  }

  /** Returns so many µm. */
  public static Length um(double value) {
    return Length.of(value, um);
  }

  /** Returns so many nm. */
  public static Length nm(double value) {
    return Length.of(value, nm);
  }

  /** Returns so many ft. */
  public static Length ft(double value) {
    return Length.of(value, ft);
  }

  /** Returns so many in. */
  public static Length inches(double value) {
    return Length.of(value, inches);
  }

  /** Returns so many .1in. */
  public static Length tenthInches(double value) {
    return Length.of(value, tenthInches);
  }

  /** Returns so many m². */
  public static Area m2(double value) {
    return Area.of(value, m2);
  }

  /** Returns so many km². */
  public static Area km2(double value) {
    return Area.of(value, km2);
  }

  /** Returns so many cm². */
  public static Area cm2(double value) {
    return Area.of(value, cm2);
  }

  /** Returns so many ft². */
  public static Area ft2(double value) {
    return Area.of(value, ft2);
  }

  /** Returns so many m³. */
  public static Volume m3(double value) {
    return Volume.of(value, m3);
  }

  /** Returns so many cm³. */
  public static Volume cm3(double value) {
    return Volume.of(value, cm3);
  }

  /** Returns so many L. */
  public static Volume litres(double value) {
    return Volume.of(value, litres);
  }

  /** Returns so many bbl. */
  public static Volume bbl(double value) {
    return Volume.of(value, bbl);
  }

  /** Returns so many ft³. */
  public static Volume ft3(double value) {
    return Volume.of(value, ft3);
  }

  /** Returns so many s. */
  public static Time s(double value) {
    return Time.of(value, s);
  }

  /** Returns so many ms. */
  public static Time ms(double value) {
    return Time.of(value, ms);
  }

  /** Returns so many min. */
  public static Time minutes(double value) {
    return Time.of(value, minutes);
  }

  /** Returns so many h. */
  public static Time hours(double value) {
    return Time.of(value, hours);
  }

  /** Returns so many d. */
  public static Time days(double value) {
    return Time.of(value, days);
  }

  /** Returns so many yr. */
  public static Time years(double value) {
    return Time.of(value, years);
  }

  /** Returns so many Ma. */
  public static Time Ma(double value) {
    return Time.of(value, Ma);
  }

  /** Returns so many Pa. */
  public static Pressure Pa(double value) {
    return Pressure.of(value, Pa);
  }

  /** Returns so many kPa. */
  public static Pressure kPa(double value) {
    return Pressure.of(value, kPa);
  }

  /** Returns so many MPa. */
  public static Pressure MPa(double value) {
    return Pressure.of(value, MPa);
  }

  /** Returns so many GPa. */
  public static Pressure GPa(double value) {
    return Pressure.of(value, GPa);
  }

  /** Returns so many bar. */
  public static Pressure bar(double value) {
    return Pressure.of(value, bar);
  }

  /** Returns so many psi. */
  public static Pressure psi(double value) {
    return Pressure.of(value, psi);
  }

  /** Returns so many atm. */
  public static Pressure atm(double value) {
    return Pressure.of(value, atm);
  }

  /** Returns so many K. */
  public static Temperature K(double value) {
    return Temperature.of(value, K);
  }

  /** Returns so many °C. */
  public static Temperature degC(double value) {
    return Temperature.of(value, degC);
  }

  /** Returns so many °F. */
  public static Temperature degF(double value) {
    return Temperature.of(value, degF);
  }

  /** Returns so many Pa·s. */
  public static Viscosity PaS(double value) {
    return Viscosity.of(value, PaS);
  }

  /** Returns so many mPa·s. */
  public static Viscosity mPaS(double value) {
    return Viscosity.of(value, mPaS);
  }

  /** Returns so many cP. */
  public static Viscosity cP(double value) {
    return Viscosity.of(value, cP);
  }

  /** Returns so many kg/m³. */
  public static Density kgPerM3(double value) {
    return Density.of(value, kgPerM3);
  }

  /** Returns so many g/cm³. */
  public static Density gPerCm3(double value) {
    return Density.of(value, gPerCm3);
  }

  /** Returns so many lb/ft³. */
  public static Density lbPerFt3(double value) {
    return Density.of(value, lbPerFt3);
  }

  /** Returns so many m². */
  public static Permeability squareMetres(double value) {
    return Permeability.of(value, squareMetres);
  }

  /** Returns so many µm². */
  public static Permeability um2(double value) {
    return Permeability.of(value, um2);
  }

  /** Returns so many cm². */
  public static Permeability squareCentimetres(double value) {
    return Permeability.of(value, squareCentimetres);
  }

  /** Returns so many D. */
  public static Permeability darcy(double value) {
    return Permeability.of(value, darcy);
  }

  /** Returns so many mD. */
  public static Permeability mD(double value) {
    return Permeability.of(value, mD);
  }

  /** Returns so many µD. */
  public static Permeability uD(double value) {
    return Permeability.of(value, uD);
  }

  /** Returns so many nD. */
  public static Permeability nD(double value) {
    return Permeability.of(value, nD);
  }

  /** Returns so many mD·m. */
  public static PermeabilityThickness mDm(double value) {
    return PermeabilityThickness.of(value, mDm);
  }

  /** Returns so many mD·ft. */
  public static PermeabilityThickness mDft(double value) {
    return PermeabilityThickness.of(value, mDft);
  }

  /** Returns so many m³. */
  public static PermeabilityThickness kh(double value) {
    return PermeabilityThickness.of(value, kh);
  }

  /** Returns so many m/s. */
  public static HydraulicConductivity mPerSecond(double value) {
    return HydraulicConductivity.of(value, mPerSecond);
  }

  /** Returns so many m/d. */
  public static HydraulicConductivity mPerDay(double value) {
    return HydraulicConductivity.of(value, mPerDay);
  }

  /** Returns so many cm/s. */
  public static HydraulicConductivity cmPerSecond(double value) {
    return HydraulicConductivity.of(value, cmPerSecond);
  }

  /** Returns so many ft/d. */
  public static HydraulicConductivity ftPerDay(double value) {
    return HydraulicConductivity.of(value, ftPerDay);
  }

  /** Returns so many m²/s. */
  public static Transmissivity m2PerSecond(double value) {
    return Transmissivity.of(value, m2PerSecond);
  }

  /** Returns so many m²/d. */
  public static Transmissivity m2PerDay(double value) {
    return Transmissivity.of(value, m2PerDay);
  }

  /** Returns so many ft²/d. */
  public static Transmissivity ft2PerDay(double value) {
    return Transmissivity.of(value, ft2PerDay);
  }

  /** Returns so many m³/s. */
  public static Rate m3PerSecond(double value) {
    return Rate.of(value, m3PerSecond);
  }

  /** Returns so many m³/d. */
  public static Rate m3PerDay(double value) {
    return Rate.of(value, m3PerDay);
  }

  /** Returns so many m³/h. */
  public static Rate m3PerHour(double value) {
    return Rate.of(value, m3PerHour);
  }

  /** Returns so many L/s. */
  public static Rate litresPerSecond(double value) {
    return Rate.of(value, litresPerSecond);
  }

  /** Returns so many cm³/s. */
  public static Rate cm3PerSecond(double value) {
    return Rate.of(value, cm3PerSecond);
  }

  /** Returns so many bbl/d. */
  public static Rate bblPerDay(double value) {
    return Rate.of(value, bblPerDay);
  }

  /** Returns so many ft³/d. */
  public static Rate ft3PerDay(double value) {
    return Rate.of(value, ft3PerDay);
  }

  /** Returns so many m/s. */
  public static Velocity metresPerSecond(double value) {
    return Velocity.of(value, metresPerSecond);
  }

  /** Returns so many km/s. */
  public static Velocity kmPerSecond(double value) {
    return Velocity.of(value, kmPerSecond);
  }

  /** Returns so many ft/s. */
  public static Velocity ftPerSecond(double value) {
    return Velocity.of(value, ftPerSecond);
  }

  /** Returns so many m/yr. */
  public static Velocity mPerYear(double value) {
    return Velocity.of(value, mPerYear);
  }

  /** Returns so many rad. */
  public static Angle radians(double value) {
    return Angle.of(value, radians);
  }

  /** Returns so many °. */
  public static Angle degrees(double value) {
    return Angle.of(value, degrees);
  }

  /** Returns so many N/m. */
  public static InterfacialTension NPerM(double value) {
    return InterfacialTension.of(value, NPerM);
  }

  /** Returns so many mN/m. */
  public static InterfacialTension mNPerM(double value) {
    return InterfacialTension.of(value, mNPerM);
  }

  /** Returns so many fraction. */
  public static Fraction fraction(double value) {
    return Fraction.of(value, fraction);
  }

  /** Returns so many %. */
  public static Fraction percent(double value) {
    return Fraction.of(value, percent);
  }

  /** Returns so many ppm. */
  public static Fraction ppm(double value) {
    return Fraction.of(value, ppm);
  }

  /** Returns so many 1. */
  public static Ratio number(double value) {
    return Ratio.of(value, number);
  }

  /** Returns so many decades. */
  public static Ratio decades(double value) {
    return Ratio.of(value, decades);
  }

  /** Returns so many s/m. */
  public static Slowness sPerM(double value) {
    return Slowness.of(value, sPerM);
  }

  /** Returns so many µs/ft. */
  public static Slowness usPerFt(double value) {
    return Slowness.of(value, usPerFt);
  }

  /** Returns so many µs/m. */
  public static Slowness usPerM(double value) {
    return Slowness.of(value, usPerM);
  }

  /** Returns so many ohm·m. */
  public static Resistivity ohmM(double value) {
    return Resistivity.of(value, ohmM);
  }

  /** Returns so many gAPI. */
  public static GammaRay gAPI(double value) {
    return GammaRay.of(value, gAPI);
  }

  /** Returns so many 1/Pa. */
  public static Compressibility perPa(double value) {
    return Compressibility.of(value, perPa);
  }

  /** Returns so many 1/MPa. */
  public static Compressibility perMPa(double value) {
    return Compressibility.of(value, perMPa);
  }

  /** Returns so many 1/psi. */
  public static Compressibility perPsi(double value) {
    return Compressibility.of(value, perPsi);
  }

  /** Returns so many K/m. */
  public static ThermalGradient KPerM(double value) {
    return ThermalGradient.of(value, KPerM);
  }

  /** Returns so many °C/km. */
  public static ThermalGradient degCPerKm(double value) {
    return ThermalGradient.of(value, degCPerKm);
  }

  /** Returns so many Pa/m. */
  public static PressureGradient PaPerM(double value) {
    return PressureGradient.of(value, PaPerM);
  }

  /** Returns so many psi/ft. */
  public static PressureGradient psiPerFt(double value) {
    return PressureGradient.of(value, psiPerFt);
  }

  /** Returns so many bar/m. */
  public static PressureGradient barPerM(double value) {
    return PressureGradient.of(value, barPerM);
  }

  /** Returns so many MPa/km. */
  public static PressureGradient MPaPerKm(double value) {
    return PressureGradient.of(value, MPaPerKm);
  }

  /** Returns so many 1/m. */
  public static SpecificSurface perM(double value) {
    return SpecificSurface.of(value, perM);
  }

  /** Returns so many 1/cm. */
  public static SpecificSurface perCm(double value) {
    return SpecificSurface.of(value, perCm);
  }

  /** Returns so many 1/µm. */
  public static SpecificSurface perUm(double value) {
    return SpecificSurface.of(value, perUm);
  }

  /** Makes sure that all units are registered. */
  static void load() {
    // loading this class registers them
  }
}
