package org.seepledger.desktop.draw;

import java.util.ArrayList;
import java.util.List;
import org.seepledger.desktop.action.Action;
import org.seepledger.desktop.map.MapModel;

/**
 * What can be done while drawing.
 *
 * @param model the drawing
 * @param hand works with the tools
 * @param files saves and reads
 * @param tray what one draws with
 * @param changed told after each
 */
public record DraftActions(DraftModel model, DraftHand hand, DraftFiles files, Tray tray, Runnable changed) {

    private static final String DRAW = "actions.group.draw";
    private static final String FILE = "actions.group.file";
    private static final int FAR = 10;

    /**
     * {@return all of them}
     *
     * @param map tells how large a pixel is
     */
    public List<Action> all(MapModel map) {
        List<Action> all = new ArrayList<>();
        for (Tool tool : Tool.values()) {
            all.add(action(DRAW, tool.key(), tool.keys(), () -> model.choose(tool)));
        }
        all.add(action(DRAW, "action.finish", "Enter", hand::finish));
        all.add(action(DRAW, "action.cancel", "Esc", hand::cancel));
        all.add(action(DRAW, "action.delete", "Delete", hand::delete));
        all.add(action(DRAW, "action.back", "Backspace", hand::delete));
        all.add(new Action(
                DRAW, "action.undo", "Shortcut+Z", () -> model.undoable().isPresent(), told(model::undo)));
        all.add(new Action(
                DRAW, "action.redo", "Shortcut+Shift+Z", () -> model.redoable().isPresent(), told(model::redo)));
        all.add(action(DRAW, "action.prism.next", "N", () -> model.selectNext(1)));
        all.add(action(DRAW, "action.prism.before", "Shift+N", () -> model.selectNext(-1)));
        all.add(action(DRAW, "action.vertex.next", "Tab", () -> hand.cycle(1)));
        all.add(action(DRAW, "action.vertex.before", "Shift+Tab", () -> hand.cycle(-1)));
        all.add(action(DRAW, "action.type", "T", tray::focusTyped));
        all.add(action(DRAW, "action.card", "F8", tray::flipCard));
        nudges(all, map);
        all.add(action(FILE, "action.save", "Shortcut+S", files::save));
        all.add(action(FILE, "action.export", "Shortcut+Shift+S", files::export));
        all.add(ofTransects("action.transects.export", "Shortcut+Shift+L", files::exportTransects));
        all.add(ofTransects("action.transects.import", "Shortcut+L", files::importTransects));
        all.add(action(FILE, "action.import", "Shortcut+I", files::importFile));
        return all;
    }

    private Action ofTransects(String name, String keys, Runnable run) {
        return new Action(FILE, name, keys, model::hasSolutes, told(run));
    }

    private void nudges(List<Action> all, MapModel map) {
        String[] keys = {"Left", "Right", "Up", "Down"};
        int[][] ways = {{-1, 0}, {1, 0}, {0, 1}, {0, -1}};
        for (int i = 0; i < keys.length; i++) {
            int[] way = ways[i];
            String name = "action.nudge." + keys[i].toLowerCase(java.util.Locale.ROOT);
            all.add(action(DRAW, name, keys[i], () -> nudge(map, way, 1)));
            all.add(action(DRAW, name + ".far", "Shift+" + keys[i], () -> nudge(map, way, FAR)));
        }
    }

    /** Moves the chosen vertex by pixels; without one, the map. */
    private void nudge(MapModel map, int[] way, int pixels) {
        double pixel = pixels / map.camera().get().scale();
        if (!hand.nudge(way[0] * pixel, way[1] * pixel)) {
            map.drag(-60.0 * way[0], 60.0 * way[1]);
        }
    }

    private Action action(String group, String name, String keys, Runnable run) {
        return new Action(group, name, keys, told(run));
    }

    private Runnable told(Runnable run) {
        return () -> {
            run.run();
            changed.run();
        };
    }
}
