package org.seepledger.desktop.command;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.regex.Pattern;

/** A command as it is typed in a shell (POSIX.1-2017, Shell Command Language, 2.2 Quoting), an option a line. */
public final class CommandText {

    private static final Pattern PLAIN = Pattern.compile("[\\p{Alnum}_./:@%+=,-]+");
    private static final String NEXT = " \\\n    ";

    private final StringBuilder text;

    private CommandText(String name) {
        this.text = new StringBuilder("seepledger ").append(name);
    }

    /**
     * Begins a command.
     *
     * @param name its name
     * @param argument what it works on
     * @return it
     */
    public static CommandText of(String name, Object argument) {
        CommandText command = new CommandText(name);
        command.text.append(' ').append(quoted(argument.toString()));
        return command;
    }

    /**
     * Begins a command that works on what its options name.
     *
     * @param name its name
     * @return it
     */
    public static CommandText of(String name) {
        return new CommandText(name);
    }

    /**
     * Adds an option.
     *
     * @param option its name
     * @param value its value
     * @return this
     */
    public CommandText with(String option, Object value) {
        text.append(NEXT).append(option).append(' ').append(quoted(value.toString()));
        return this;
    }

    /**
     * Adds an option, if it has a value.
     *
     * @param option its name
     * @param value its value; empty to leave the option out
     * @return this
     */
    public CommandText with(String option, Optional<?> value) {
        value.ifPresent(given -> with(option, given));
        return this;
    }

    /**
     * Adds an option without a value.
     *
     * @param option its name
     * @param wanted whether it is added
     * @return this
     */
    public CommandText flag(String option, boolean wanted) {
        text.append(wanted ? NEXT + option : "");
        return this;
    }

    /** {@return a word that a shell takes as it is} */
    private static String quoted(String word) {
        return PLAIN.matcher(word).matches() ? word : "'" + word.replace("'", "'\\''") + "'";
    }

    /**
     * {@return a choice as it is typed}
     *
     * @param choice the choice
     */
    public static String word(Enum<?> choice) {
        return choice.name().toLowerCase(Locale.ROOT).replace('_', '-');
    }

    /** {@return the command, its lines joined by backslashes} */
    @Override
    public String toString() {
        return text.toString();
    }

    /**
     * {@return commands, one after the other}
     *
     * @param commands the commands
     */
    public static String script(List<CommandText> commands) {
        List<String> texts = new ArrayList<>();
        commands.forEach(command -> texts.add(command.toString()));
        return String.join("\n", texts);
    }
}
