package etchloom.rules;

/** Words in parts, put together only where they are told. */
final class Words {
  private final Object[] parts;

  private Words(Object[] parts) {
    this.parts = parts;
  }

  static Words of(Object... parts) {
    return new Words(parts.clone());
  }

  @Override
  public String toString() {
    StringBuilder out = new StringBuilder();
    for (Object part : parts) {
      out.append(part);
    }
    return out.toString();
  }
}
