package connate.formula;

import java.util.Arrays;

/** Arithmetic run over one row or over all, one class for each number of inputs. */
interface Loop {

  /** Returns the result of one row. */
  double one(double[] in);

  /** Fills the results of all rows; where {@code same}, a column's single number stands in each. */
  void all(double[][] in, boolean[] same, double[] out);

  static Loop of(Formula.Of1 f) {
    return new Loop() {
      @Override
      public double one(double[] in) {
        return f.at(in[0]);
      }

      @Override
      public void all(double[][] in, boolean[] same, double[] out) {
        double[] a = in[0];
        for (int row = 0; row < out.length; row++) {
          out[row] = f.at(a[row]);
        }
      }
    };
  }

  static Loop of(Formula.Of2 f) {
    return new Loop() {
      @Override
      public double one(double[] in) {
        return f.at(in[0], in[1]);
      }

      @Override
      public void all(double[][] in, boolean[] same, double[] out) {
        double[] a = in[0];
        double[] b = in[1];
        int da = step(same[0]);
        int db = step(same[1]);
        for (int row = 0; row < out.length; row++) {
          out[row] = f.at(a[row * da], b[row * db]);
        }
      }
    };
  }

  static Loop of(Formula.Of3 f) {
    return new Loop() {
      @Override
      public double one(double[] in) {
        return f.at(in[0], in[1], in[2]);
      }

      @Override
      public void all(double[][] in, boolean[] same, double[] out) {
        int da = step(same[0]);
        int db = step(same[1]);
        int dc = step(same[2]);
        for (int row = 0; row < out.length; row++) {
          out[row] = f.at(in[0][row * da], in[1][row * db], in[2][row * dc]);
        }
      }
    };
  }

  static Loop of(Formula.Of4 f) {
    return new Loop() {
      @Override
      public double one(double[] in) {
        return f.at(in[0], in[1], in[2], in[3]);
      }

      @Override
      public void all(double[][] in, boolean[] same, double[] out) {
        int da = step(same[0]);
        int db = step(same[1]);
        int dc = step(same[2]);
        int dd = step(same[3]);
        for (int row = 0; row < out.length; row++) {
          out[row] = f.at(in[0][row * da], in[1][row * db], in[2][row * dc], in[3][row * dd]);
        }
      }
    };
  }

  static Loop ofAny(Formula.OfAny f) {
    return new Loop() {
      @Override
      public double one(double[] in) {
        return f.at(in);
      }

      @Override
      public void all(double[][] in, boolean[] same, double[] out) {
        double[] row = new double[in.length];
        for (int at = 0; at < out.length; at++) {
          for (int i = 0; i < row.length; i++) {
            row[i] = in[i][same[i] ? 0 : at];
          }
          out[at] = Arrays.stream(row).anyMatch(Double::isNaN) ? Double.NaN : f.at(row);
        }
      }
    };
  }

  private static int step(boolean same) {
    return same ? 0 : 1;
  }
}
