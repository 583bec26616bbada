package etchloom.proof;

import etchloom.proof.image.JobFile;
import etchloom.proof.read.JobReader;
import etchloom.proof.read.UnreadableFile;
import java.io.ByteArrayInputStream;
import java.io.IOException;
import java.util.Arrays;
import java.util.Optional;
import java.util.SortedMap;
import java.util.TreeMap;
import java.util.TreeSet;
import java.util.zip.ZipEntry;
import java.util.zip.ZipInputStream;

/** Holds the fab's archive against the set: the same bytes, and a job file that lists them. */
final class ZipProof {
  private final String name;
  private final Findings out;

  ZipProof(String name, Findings out) {
    this.name = name;
    this.out = out;
  }

  void check(byte[] zip, SortedMap<String, byte[]> set) {
    TreeMap<String, byte[]> entries = new TreeMap<>();
    try (ZipInputStream in = new ZipInputStream(new ByteArrayInputStream(zip))) {
      for (ZipEntry e = in.getNextEntry(); e != null; e = in.getNextEntry()) {
        entries.put(e.getName(), in.readAllBytes());
      }
    } catch (IOException e) {
      out.add(ProofNames.UNREADABLE, name, "the archive is damaged: " + e.getMessage());
      return;
    }
    entries.forEach(
        (file, bytes) -> {
          if (!set.containsKey(file)) {
            wrong("holds " + file + ", which the set does not");
          } else if (!file.endsWith(".gbrjob") && !Arrays.equals(bytes, set.get(file))) {
            wrong("its " + file + " is not that of the set");
          }
        });
    for (String file : set.keySet()) {
      boolean drill = file.endsWith("-plated.gbr") || file.endsWith("-nonplated.gbr");
      boolean wanted =
          (file.endsWith(".gbr") && !drill)
              || file.endsWith(".xnc")
              || file.endsWith(".ipc")
              || file.endsWith(".gbrjob");
      if (wanted && !entries.containsKey(file)) {
        wrong("lacks " + file);
      }
    }
    job(entries);
  }

  private void job(SortedMap<String, byte[]> entries) {
    for (String file : entries.keySet()) {
      if (file.endsWith(".gbrjob")) {
        try {
          lists(JobReader.read(file, entries.get(file)), entries);
        } catch (UnreadableFile u) {
          out.add(
              new ProofFinding(
                  ProofNames.UNREADABLE, name, u.line(), "", Optional.empty(), u.getMessage()));
        }
      }
    }
  }

  private void lists(JobFile job, SortedMap<String, byte[]> entries) {
    TreeSet<String> listed = new TreeSet<>();
    job.files().forEach(e -> listed.add(e.path()));
    for (String file : listed) {
      if (!entries.containsKey(file)) {
        wrong("its job file lists " + file + ", which is not in it");
      }
    }
    for (String file : entries.keySet()) {
      if ((file.endsWith(".gbr") || file.endsWith(".xnc")) && !listed.contains(file)) {
        wrong("its job file does not list " + file);
      }
    }
  }

  private void wrong(String message) {
    out.add(ProofNames.ARCHIVE, name, message);
  }
}
