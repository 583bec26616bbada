package etchloom.browser;

import java.lang.annotation.ElementType;
import java.lang.annotation.Retention;
import java.lang.annotation.RetentionPolicy;
import java.lang.annotation.Target;
import org.junit.jupiter.api.extension.BeforeAllCallback;
import org.junit.jupiter.api.extension.ConditionEvaluationResult;
import org.junit.jupiter.api.extension.ExecutionCondition;
import org.junit.jupiter.api.extension.ExtendWith;
import org.junit.jupiter.api.extension.ExtensionContext;

/**
 * Marks tests that look at a page in Chromium. Without one they are skipped, with a line that says
 * what to install; with {@value #REQUIRED} set in the environment, as {@code .ci/run} sets it, they
 * fail instead.
 */
@Target(ElementType.TYPE)
@Retention(RetentionPolicy.RUNTIME)
@ExtendWith(NeedsBrowser.Present.class)
public @interface NeedsBrowser {
  String REQUIRED = "ETCHLOOM_BROWSER_REQUIRED";

  /** Whether the tests can run at all, and that the browser ends when all have run. */
  final class Present implements ExecutionCondition, BeforeAllCallback {
    private static final ExtensionContext.Namespace HERE =
        ExtensionContext.Namespace.create(Present.class);

    @Override
    public void beforeAll(ExtensionContext context) {
      context
          .getRoot()
          .getStore(HERE)
          .getOrComputeIfAbsent("end", k -> (AutoCloseable) Browser::end);
    }

    @Override
    public ConditionEvaluationResult evaluateExecutionCondition(ExtensionContext context) {
      return Browser.missing()
          .filter(m -> System.getenv(REQUIRED) == null)
          .map(
              m -> {
                System.err.println(context.getDisplayName() + " skipped: " + m);
                return ConditionEvaluationResult.disabled(m);
              })
          .orElse(ConditionEvaluationResult.enabled("left to Browser, which fails without one"));
    }
  }
}
