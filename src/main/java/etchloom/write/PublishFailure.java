package etchloom.write;

import java.io.IOException;
import java.nio.file.AccessDeniedException;
import java.nio.file.FileAlreadyExistsException;
import java.nio.file.FileSystemException;
import java.nio.file.NoSuchFileException;
import java.nio.file.Path;

/** A set that could not be put in its place; the message is one line in the user's words. */
public final class PublishFailure extends IOException {
  private static final long serialVersionUID = 1;

  /** What kept the set from its place. */
  public enum Reason {
    /** Something stands there that Etchloom did not write. */
    NOT_OURS,
    /** An earlier set stands there, and somebody has changed it. */
    CHANGED,
    /** Another run is writing there. */
    BUSY,
    /** The disk: full, read-only, no permission, broken. */
    DISK
  }

  private final Reason reason;

  PublishFailure(Reason reason, String message) {
    super(message);
    this.reason = reason;
  }

  private PublishFailure(Reason reason, String message, IOException cause) {
    super(message, cause);
    this.reason = reason;
  }

  public Reason reason() {
    return reason;
  }

  /** As it is, or as trouble with the disk. */
  static PublishFailure of(IOException e, Path place) {
    if (e instanceof PublishFailure f) {
      return f;
    }
    return new PublishFailure(Reason.DISK, place + ": cannot be written: " + words(e), e);
  }

  /** Of trouble that came when the new set was in its place already. */
  static PublishFailure after(IOException e, Path place) {
    PublishFailure f = of(e, place);
    return new PublishFailure(
        f.reason,
        place + ": the new set is there, but the earlier one could not be removed: " + words(e),
        e);
  }

  private static String words(IOException e) {
    if (e instanceof AccessDeniedException a) {
      return "no permission for " + a.getFile();
    }
    if (e instanceof NoSuchFileException n) {
      // A lock that never was: the folder takes no files.
      Path lost = Path.of(n.getFile());
      boolean lock = lost.getFileName().toString().endsWith("-lock");
      return lock ? "cannot write in " + lost.getParent() : lost + " has gone";
    }
    if (e instanceof FileAlreadyExistsException x) {
      return x.getFile() + " is in the way";
    }
    if (e instanceof FileSystemException f && f.getReason() != null) {
      return f.getReason() + " (" + f.getFile() + ")";
    }
    return e.getMessage() == null ? e.getClass().getSimpleName() : e.getMessage();
  }
}
