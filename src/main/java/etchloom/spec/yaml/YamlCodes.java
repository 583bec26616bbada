package etchloom.spec.yaml;

/** Codes of findings about a file as such, before any key of it is looked at. */
public final class YamlCodes {
  private YamlCodes() {}

  /** The file is larger than is read at all; specs are a few kilobytes. */
  public static final String TOO_BIG = "file-too-big";

  /** The bytes are not UTF-8 text; save the file as plain text in UTF-8. */
  public static final String ENCODING = "encoding";

  /** Nothing but blanks and comments; start from a template. */
  public static final String EMPTY = "empty-file";

  /** The text breaks YAML's own rules; the message says where it stopped making sense. */
  public static final String SYNTAX = "yaml";

  /** A tab where YAML allows only spaces, mostly as indentation; use spaces. */
  public static final String TAB = "tab";

  /** An anchor or alias ({@code &name}, {@code *name}); write the value out where it is used. */
  public static final String ANCHOR = "anchor";

  /** A tag ({@code !something}); leave it out, the key says what kind of value it takes. */
  public static final String TAG = "tag";

  /** A second document ({@code ---}) in the file; one file holds one. */
  public static final String DOCUMENTS = "documents";

  /** Groups within groups beyond any sense. */
  public static final String DEPTH = "depth";

  /** Far more keys and values than any spec has. */
  public static final String TOO_MANY = "too-many-values";

  /** The same key twice in one group; delete one. */
  public static final String DUPLICATE_KEY = "duplicate-key";

  /** A group or list where a plain key word belongs. */
  public static final String KEY_SHAPE = "key-shape";
}
