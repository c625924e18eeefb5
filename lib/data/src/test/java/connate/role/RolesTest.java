package connate.role;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import connate.quantity.Units;
import java.util.HashSet;
import java.util.List;
import java.util.Set;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class RolesTest {

  @AfterEach
  void forget() {
    Roles.reset();
  }

  /** Common practice, no source: names as logging and core laboratories write them. */
  @ParameterizedTest
  @CsvSource({
    "GR, GAPI, gamma ray",
    "gr_edtc, , gamma ray",
    "GRABC, API, gamma ray",
    "RHOB, G/C3, bulk density",
    "DEPT, F, depth",
    "Depth_MD, m, depth",
    "NPHI, V/V, neutron porosity",
    "SPHI, decp, sonic porosity",
    "SP, MV, spontaneous potential",
    "DT, US/F, sonic",
    "k_air, mD, permeability",
    "Permeability, m2, permeability",
    "PHI, '', porosity",
    "core porosity, %, porosity",
    "RT90, ohmm, deep resistivity",
    "Well Name, '', well",
    "AZI, deg, azimuth",
    "CALI, in, caliper"
  })
  void namesOfTheTrade(String name, String unit, String role) {
    assertEquals(role, Roles.find(name, unit == null ? "" : unit).orElseThrow().name());
  }

  /** A unit of another dimension speaks against a role; one that nobody knows does not. */
  @Test
  void unitDecides() {
    assertTrue(Roles.find("GR", "ohm.m").isEmpty());
    assertTrue(Roles.find("K", "degC").isEmpty());
    assertEquals("gamma ray", Roles.find("GR", "counts").orElseThrow().name());
    assertTrue(Roles.find("VALUE", "").isEmpty());
    assertTrue(Roles.find("", "").isEmpty());
  }

  @Test
  void workbookAddsNames() {
    assertTrue(Roles.find("MYPHI", "%").isEmpty());
    Roles.add("Porosity", "myphi");
    Role porosity = Roles.find("MYPHI", "%").orElseThrow();
    assertEquals(0, porosity.rank("my_phi"));
    assertEquals(1, porosity.rank("porosity"));
    Roles.reset();
    assertTrue(Roles.find("MYPHI", "%").isEmpty());
    assertThrows(IllegalArgumentException.class, () -> Roles.add("hue", "x"));
    assertThrows(IllegalArgumentException.class, () -> Roles.add("porosity", "..."));
  }

  @Test
  void roleKnowsItsUnits() {
    Role density = Roles.named("bulk density").orElseThrow();
    assertEquals(Units.kgPerM3, density.unit("K/M3").orElseThrow());
    assertTrue(density.isMeasuredIn(Units.gPerCm3));
    assertTrue(density.unit("ohmm").isEmpty());
    assertTrue(Roles.named("well").orElseThrow().unit("m").isEmpty());
    assertTrue(Roles.named("colour").isEmpty());
  }

  /** No name may stand for two roles. */
  @Test
  void namesAreUniqueOverAllRoles() {
    Set<String> seen = new HashSet<>();
    for (Role role : Roles.all()) {
      for (String name : role.names()) {
        assertTrue(seen.add(name), name + " stands twice, again for " + role.name());
      }
    }
    assertTrue(seen.size() > 150, "only " + seen.size());
    assertThrows(UnsupportedOperationException.class, () -> Roles.all().add(null));
    assertEquals(List.of("sp", "ssp"), Roles.named("spontaneous potential").orElseThrow().names());
  }
}
