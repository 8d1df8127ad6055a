package ropewalk.command.internal;

import java.io.PrintStream;
import java.util.Locale;
import ropewalk.survey.SurveyListener;

/**
 * Tells on standard error how a survey goes: a bar on a terminal, a plain line now and then in a pipe, messages in any
 * case.
 */
final class Progress implements SurveyListener {

    private enum Style { BAR, LINES, NONE }

    private static final long LINE_EVERY_NANOS = 10_000_000_000L;
    private static final int BAR_WIDTH = 30;

    private final PrintStream out;
    private final Style style;
    private final long begin = System.nanoTime();
    private long lastLine = begin;
    private boolean barShown;

    private Progress(PrintStream out, Style style) {
        this.out = out;
        this.style = style;
    }

    /** The launcher says in the property {@code ropewalk.terminal} whether standard error is a terminal. */
    static Progress onStandardError(boolean quiet) {
        Style style = Boolean.getBoolean("ropewalk.terminal") ? Style.BAR : Style.LINES;
        return new Progress(System.err, quiet ? Style.NONE : style);
    }

    @Override
    public synchronized void message(String line) {
        clear();
        out.println("ropewalk: " + Visible.text(line));
    }

    @Override
    public synchronized void progress(long links, long bytesRead, long bytesInAll) {
        long now = System.nanoTime();
        double rate = links / Math.max(1e-9, (now - begin) / 1e9);
        if (style == Style.BAR) {
            out.print("\r" + line(links, bytesRead, bytesInAll, rate) + "\u001b[K");
            out.flush();
            barShown = true;
        } else if (style == Style.LINES && now - lastLine > LINE_EVERY_NANOS) {
            lastLine = now;
            out.printf(Locale.ROOT, "ropewalk: %d links so far, %s%.0f links/s%n", links,
                    bytesInAll > 0 ? bytesRead * 100 / bytesInAll + " % of the input, " : "", rate);
        }
    }

    private static String line(long links, long bytesRead, long bytesInAll, double rate) {
        if (bytesInAll == 0) {
            return String.format(Locale.ROOT, "%d links, %.0f links/s", links, rate);
        }
        int filled = (int) (BAR_WIDTH * bytesRead / bytesInAll);
        return "│" + "━".repeat(filled) + " ".repeat(BAR_WIDTH - filled)
                + String.format(Locale.ROOT, "│ %3d %%  %d links, %.0f links/s", bytesRead * 100 / bytesInAll, links, rate);
    }

    /** Takes the bar away. */
    synchronized void end() {
        clear();
    }

    private void clear() {
        if (barShown) {
            out.print("\r\u001b[K");
            out.flush();
            barShown = false;
        }
    }
}
