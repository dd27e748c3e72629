package org.seepledger.desktop.port;

import java.nio.file.Path;
import java.util.ArrayDeque;
import java.util.ArrayList;
import java.util.Deque;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;

/** A machine that answers what a test told it to, and keeps what it was given. */
public final class GivenAnswers implements FileDialogs, CopyBoard, Questions, RecentFolders, Settings, Opener {

    /** The answers to come, in order: paths for dialogs, numbers for questions. */
    public final Deque<Optional<Path>> paths = new ArrayDeque<>();

    /** The answers to questions, in order. */
    public final Deque<Optional<Integer>> answers = new ArrayDeque<>();

    /** What was asked. */
    public final List<String> asked = new ArrayList<>();

    /** What was copied: text or tab-separated lines, then HTML if there was any. */
    public final List<String> copied = new ArrayList<>();

    /** What is kept from run to run. */
    public final Map<String, String> settings = new HashMap<>();

    /** What was opened. */
    public final List<Path> opened = new ArrayList<>();

    private final List<Path> recent = new ArrayList<>();

    @Override
    public Optional<Path> folder(String title) {
        asked.add(title);
        return paths.remove();
    }

    @Override
    public Optional<Path> fileToRead(String title, Kind kind) {
        return folder(title);
    }

    @Override
    public List<Path> filesToRead(String title) {
        return folder(title).map(List::of).orElse(List.of());
    }

    @Override
    public Optional<Path> fileToWrite(String title, Kind kind, Path suggested) {
        return folder(title);
    }

    @Override
    public Optional<Integer> ask(String title, String question, List<String> choices) {
        asked.add(question);
        return answers.remove();
    }

    @Override
    public void table(String tabSeparated, String html) {
        copied.add(tabSeparated);
        copied.add(html);
    }

    @Override
    public void text(String text) {
        copied.add(text);
    }

    @Override
    public Optional<String> get(String key) {
        return Optional.ofNullable(settings.get(key));
    }

    @Override
    public void put(String key, String value) {
        settings.put(key, value);
    }

    @Override
    public void open(Path path) {
        opened.add(path);
    }

    @Override
    public List<Path> list() {
        return List.copyOf(recent);
    }

    @Override
    public void remember(Path folder) {
        recent.remove(folder);
        recent.add(0, folder);
    }

    @Override
    public void forget(Path folder) {
        recent.remove(folder);
    }
}
