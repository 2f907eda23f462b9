package dev.holdfast.history;

import java.io.IOException;
import java.io.InputStream;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Collection;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.TreeMap;
import java.util.TreeSet;

/**
 * A git repository, read by plumbing commands of the {@code git} executable. Contents are read as
 * blobs: a link is its text, and no filter changes them.
 *
 * <p>Paths are relative to the root of the working tree, with {@code /} between their parts.
 */
public final class GitRepository {
  private static final String HEAD = "HEAD";

  /** Files, and files that may be run; not links, and not other repositories. */
  private static final String REGULAR = "100";

  private final Git git;
  private final Path root;

  private GitRepository(Git git, Path root) {
    this.git = git;
    this.root = root;
  }

  /**
   * The repository that a folder lies in.
   *
   * @param folder a folder of the working tree
   * @param environment the environment of the run: a hook's index is named in it
   * @throws GitException if there is none, git refuses it, or git is absent
   */
  public static GitRepository around(Path folder, Map<String, String> environment)
      throws GitException {
    Git git = new Git(folder, environment);
    Git.Result result = git.run("rev-parse", "--show-toplevel");
    String top = result.text().strip();
    if (result.failed() || top.isEmpty()) {
      throw new GitException(refusal(folder.toAbsolutePath().normalize(), result));
    }
    Path root = Path.of(top);
    return new GitRepository(git.in(root), root);
  }

  private static String refusal(Path folder, Git.Result result) {
    if (result.errors().contains("dubious ownership")) {
      return "git refuses the repository around "
          + folder
          + ", since another user owns it; allow it with '"
          + result
              .errors()
              .lines()
              .map(String::strip)
              .filter(line -> line.startsWith("git config "))
              .findFirst()
              .orElse("git config --global --add safe.directory FOLDER")
          + "'";
    }
    if (result.errors().contains("not a git repository")) {
      return "there is no git repository around " + folder + "; run in a clone of the study";
    }
    if (result.errors().contains("work tree")) {
      return "the git repository around " + folder + " has no working tree; run in a clone of it";
    }
    return "git cannot read the repository around " + folder + ": " + result.complaint();
  }

  /** The top folder of the working tree. */
  public Path root() {
    return root;
  }

  /**
   * Resolves the name of a revision to a commit.
   *
   * @throws GitException if there is no such revision, or not in a history that was cut off
   */
  public String commit(String revision) throws GitException {
    Optional<String> commit = resolve(revision);
    if (commit.isPresent()) {
      return commit.get();
    }
    boolean shallow =
        git.must("rev-parse", "--is-shallow-repository").text().strip().equals("true");
    throw new GitException(
        "no revision '"
            + revision
            + "' in this repository"
            + (shallow
                ? ", whose history is cut off; fetch the rest with 'git fetch --unshallow', or let"
                    + " the checkout of the runner fetch all of it"
                : "; see 'git log' and 'git branch --all', and fetch what is missing"));
  }

  private Optional<String> resolve(String revision) throws GitException {
    Git.Result result =
        git.run("rev-parse", "--verify", "--quiet", "--end-of-options", revision + "^{commit}");
    return result.failed() ? Optional.empty() : Optional.of(result.text().strip());
  }

  /**
   * A file of the index that differs from the last commit.
   *
   * @param path its path
   * @param blob id of its staged content
   * @param before id of what it was at the last commit, under whatever name; empty if it is new
   */
  public record Staged(String path, String blob, Optional<String> before) {}

  /** The files of the index that differ from the last commit, by path; deleted ones left out. */
  public List<Staged> staged() throws GitException {
    return resolve(HEAD).isPresent() ? changed(HEAD) : indexed();
  }

  private List<Staged> changed(String commit) throws GitException {
    List<String> fields =
        git.must(
                "diff-index",
                "--cached",
                "--raw",
                "--no-abbrev",
                "--no-ext-diff",
                "--find-renames",
                "--diff-filter=AMRT",
                "-z",
                commit,
                "--")
            .fields();
    List<Staged> staged = new ArrayList<>();
    for (int i = 0; i < fields.size(); ) {
      // ":old-mode new-mode old-blob new-blob status", then one path, or two for a rename.
      String[] parts = fields.get(i).substring(1).split(" ");
      boolean renamed = parts[4].startsWith("R");
      String path = fields.get(renamed ? i + 2 : i + 1);
      if (parts[1].startsWith(REGULAR)) {
        staged.add(
            new Staged(
                path,
                parts[3],
                parts[0].startsWith(REGULAR) ? Optional.of(parts[2]) : Optional.empty()));
      }
      i += renamed ? 3 : 2;
    }
    return staged;
  }

  /** Everything staged, before there is a commit. */
  private List<Staged> indexed() throws GitException {
    List<Staged> staged = new ArrayList<>();
    for (String entry : git.must("ls-files", "--cached", "--stage", "-z").fields()) {
      // "mode blob stage<tab>path"
      String[] parts = entry.substring(0, entry.indexOf('\t')).split(" ");
      if (parts[0].startsWith(REGULAR)) {
        staged.add(
            new Staged(entry.substring(entry.indexOf('\t') + 1), parts[1], Optional.empty()));
      }
    }
    return staged;
  }

  /**
   * The files of a commit, by path, with the ids of their blobs. A file of the index that was
   * renamed since is found under its new name too.
   */
  public Map<String, String> filesAt(String commit) throws GitException {
    Map<String, String> files = new TreeMap<>();
    for (String entry : git.must("ls-tree", "-r", "-z", "--full-tree", commit).fields()) {
      // "mode type blob<tab>path"
      String[] parts = entry.substring(0, entry.indexOf('\t')).split(" ");
      if (parts[0].startsWith(REGULAR)) {
        files.put(entry.substring(entry.indexOf('\t') + 1), parts[2]);
      }
    }
    for (Staged changed : changed(commit)) {
      changed.before().ifPresent(blob -> files.putIfAbsent(changed.path(), blob));
    }
    return files;
  }

  /**
   * The contents of blobs.
   *
   * @param ids ids of blobs, as this class gives them
   * @param most bytes that are read of one; what lies beyond is left out
   * @return by id
   * @throws GitException if one is not there, as in a clone that left it out
   */
  public Map<String, byte[]> blobs(Collection<String> ids, int most) throws GitException {
    List<String> wanted = List.copyOf(new TreeSet<>(ids));
    if (wanted.isEmpty()) {
      return Map.of();
    }
    return git.feed(wanted, output -> contents(output, wanted, most), "cat-file", "--batch");
  }

  private static Map<String, byte[]> contents(InputStream output, List<String> ids, int most)
      throws IOException {
    Map<String, byte[]> contents = new HashMap<>();
    for (String id : ids) {
      // "id type size", the content and a line feed; or "id missing".
      String[] header = line(output).split(" ");
      if (header.length != 3) {
        throw new IOException(
            "the object " + id + " is missing; fetch the whole of the history with 'git fetch'");
      }
      long size = Long.parseLong(header[2]);
      byte[] content = output.readNBytes((int) Math.min(size, most));
      output.skipNBytes(size - content.length + 1);
      contents.put(id, content);
    }
    return contents;
  }

  private static String line(InputStream in) throws IOException {
    StringBuilder line = new StringBuilder();
    for (int next = in.read(); next >= 0 && next != '\n'; next = in.read()) {
      line.append((char) next);
    }
    return line.toString();
  }
}
