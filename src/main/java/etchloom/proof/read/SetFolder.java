package etchloom.proof.read;

import java.util.Collections;
import java.util.SortedMap;
import java.util.TreeMap;

/**
 * The files of a folder or zip file.
 *
 * @param name of the folder or zip file, for messages
 * @param files name within the folder, slashes forward, to content
 */
public record SetFolder(String name, SortedMap<String, byte[]> files) {
  public SetFolder {
    files = Collections.unmodifiableSortedMap(new TreeMap<>(files));
  }
}
