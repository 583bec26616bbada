package etchloom.rules;

import java.util.OptionalDouble;

/**
 * What the rule check needs to know from other stages.
 *
 * @param linePeakEmfVolt peak of the line-to-line back-EMF at the duty's speed, V, without any
 *     reserve; absent where it is not known
 */
public record RuleContext(OptionalDouble linePeakEmfVolt) {
  public static final RuleContext NONE = new RuleContext(OptionalDouble.empty());

  public RuleContext {
    if (linePeakEmfVolt.isPresent()
        && !(linePeakEmfVolt.getAsDouble() >= 0
            && Double.isFinite(linePeakEmfVolt.getAsDouble()))) {
      throw new IllegalArgumentException("back-EMF must be finite, got " + linePeakEmfVolt + " V");
    }
  }
}
