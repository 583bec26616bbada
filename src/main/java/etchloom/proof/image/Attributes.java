package etchloom.proof.image;

import java.util.List;
import java.util.Map;

/**
 * The X2 attributes that hold for one object.
 *
 * @param nets the fields of {@code .N}: an empty list when the file gives none, one empty string
 *     when the file says that the object belongs to no net
 * @param refdes the part of {@code .P}, empty when there is none
 * @param pin the pin of {@code .P}, empty when there is none
 * @param aperFunction the fields of {@code .AperFunction}, empty when there is none
 * @param other every further attribute by its name, in the order of the file
 */
public record Attributes(
    List<String> nets,
    String refdes,
    String pin,
    List<String> aperFunction,
    Map<String, List<String>> other) {
  public static final Attributes NONE = new Attributes(List.of(), "", "", List.of(), Map.of());

  /** The first field of {@code .AperFunction}, such as {@code ViaPad}; empty when none. */
  public String function() {
    return aperFunction.isEmpty() ? "" : aperFunction.get(0);
  }

  /** The only net named, or the empty string when there is none or more than one. */
  public String net() {
    return nets.size() == 1 ? nets.get(0) : "";
  }
}
