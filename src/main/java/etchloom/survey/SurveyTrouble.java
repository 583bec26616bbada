package etchloom.survey;

/** A survey's folder cannot be used as asked; the message says why. */
public final class SurveyTrouble extends RuntimeException {
  private static final long serialVersionUID = 1L;

  SurveyTrouble(String message) {
    super(message, null, false, false);
  }
}
