package connate.calibration;

import connate.formula.TransformForm;
import connate.method.Listening;
import connate.quantity.Units;
import connate.series.Labels;
import connate.series.Listing;
import connate.series.Series;

/** Candidate transforms side by side on the same plugs. */
public final class Transforms {

  private Transforms() {}

  /**
   * Returns the test that leaves out each group in turn, such as {@code
   * leaveOut(plugs.labels("well"))}.
   */
  public static LeaveOut leaveOut(Labels groups) {
    return LeaveOut.of(groups);
  }

  /**
   * Fits each form to the same plugs and tells its errors in decades of permeability, best first.
   *
   * @param porosity the porosity of each plug
   * @param permeability the permeability of each plug
   * @param test how plugs are left out
   * @param forms the candidates
   * @throws IllegalArgumentException if no form is given, or the plugs do not do for the test
   */
  public static Listing compare(
      Series porosity, Series permeability, LeaveOut test, TransformForm... forms) {
    if (forms.length == 0) {
      throw new IllegalArgumentException("name at least one form, such as LogLinear.FORM");
    }
    Listing.Builder table =
        Listing.titled("transforms on the same plugs, errors in decades of permeability")
            .column("form")
            .column("fitted")
            .column("n")
            .column("scatter", Units.decades)
            .column(test.words(), Units.decades)
            .column("R²");
    Plugs.of(porosity, permeability, phi -> phi).tellDropped("comparison of transforms");
    for (TransformForm form : forms) {
      Listening.used(form.card());
    }
    java.util.Arrays.stream(forms)
        .map(form -> Listening.quietly(() -> Candidate.of(form, porosity, permeability, test)))
        .sorted(java.util.Comparator.comparingDouble(Candidate::error))
        .forEach(c -> c.addTo(table));
    return table.note("best first by the error of the plugs left out").build();
  }

  /** A form, its fit and its error on plugs that it has not seen. */
  private record Candidate(TransformFit fit, double error) {

    static Candidate of(TransformForm form, Series porosity, Series permeability, LeaveOut test) {
      TransformFit fit = TransformFit.of(form, porosity, permeability);
      return new Candidate(
          fit, test.error(form, Plugs.of(porosity, permeability, form.function())));
    }

    void addTo(Listing.Builder table) {
      table.row(
          fit.form().name(),
          fit.equation(),
          fit.n(),
          fit.scatter(),
          Units.decades(error),
          fit.rSquared());
    }
  }
}
