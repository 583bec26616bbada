package etchloom.write;

import etchloom.artwork.Artwork;
import java.nio.charset.StandardCharsets;
import java.util.UUID;

/** The names by which files say that they belong together. */
final class Project {
  static final String VENDOR = "Etchloom";
  static final String APPLICATION = "etchloom";

  private Project() {}

  /**
   * An identifier in the shape of RFC 4122 version 4, which is all the Gerber format allows beside
   * version 1, but made from the title: a random one would make every run's bytes differ.
   */
  static String guid(Artwork art) {
    UUID hash =
        UUID.nameUUIDFromBytes(("etchloom/" + art.title()).getBytes(StandardCharsets.UTF_8));
    long high = (hash.getMostSignificantBits() & ~0xF000L) | 0x4000L;
    return new UUID(high, hash.getLeastSignificantBits()).toString();
  }

  /** One for all files of one drawing: they share their coordinates. */
  static String coordinates(Artwork art) {
    return guid(art);
  }
}
