package coilwright.cli;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.AtomicMoveNotSupportedException;
import java.nio.file.Files;
import java.nio.file.LinkOption;
import java.nio.file.Path;
import java.nio.file.StandardCopyOption;

/**
 * A file that is written whole or not at all: a temporary file beside it, then one atomic move.
 *
 * @param target where it shall stand
 * @param force whether an existing file may be replaced
 */
record WholeFile(Path target, boolean force) {

  static WholeFile at(Path target, boolean force) {
    return new WholeFile(target, force);
  }

  /** Refuses a target that is a folder or device, lacks its folder, or exists already. */
  void refuseIfBad() {
    if (!Files.isDirectory(folder())) {
      throw Refusal.usage(target + ": its folder does not exist; make it first");
    }
    if (Files.exists(target, LinkOption.NOFOLLOW_LINKS)) {
      if (!Files.isRegularFile(target)) {
        throw Refusal.usage(target + ": is no plain file; give --out the name of one");
      }
      if (!force) {
        throw Refusal.usage(
            target + ": exists already; give another name, or --force to replace it");
      }
    }
  }

  private Path folder() {
    return target.toAbsolutePath().getParent();
  }

  /** Writes the text; where that fails nothing is left behind. */
  void write(String text) {
    Path temporary = null;
    try {
      temporary = Files.createTempFile(folder(), ".coilwright-", ".tmp");
      Files.write(temporary, text.getBytes(StandardCharsets.UTF_8));
      move(temporary);
    } catch (IOException e) {
      discard(temporary);
      throw Refusal.failure(target + ": cannot be written (" + e.getMessage() + ")");
    }
  }

  private void move(Path temporary) throws IOException {
    try {
      Files.move(
          temporary, target, StandardCopyOption.ATOMIC_MOVE, StandardCopyOption.REPLACE_EXISTING);
    } catch (AtomicMoveNotSupportedException e) {
      throw new IOException("this file system has no atomic move", e);
    }
  }

  private static void discard(Path temporary) {
    try {
      if (temporary != null) {
        Files.deleteIfExists(temporary);
      }
    } catch (IOException e) {
      // The failure to write is what is reported.
    }
  }
}
