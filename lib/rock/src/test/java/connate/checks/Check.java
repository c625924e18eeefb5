package connate.checks;

import java.lang.annotation.ElementType;
import java.lang.annotation.Repeatable;
import java.lang.annotation.Retention;
import java.lang.annotation.RetentionPolicy;
import java.lang.annotation.Target;

/** Says which published method a test checks, and against what. */
@Retention(RetentionPolicy.RUNTIME)
@Target(ElementType.METHOD)
@Repeatable(Checks.class)
public @interface Check {

  /** The card's id. */
  String method();

  /** The kind of check. */
  Kind kind();

  /** Where the expected value comes from. */
  String source();
}
