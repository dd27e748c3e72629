package org.seepledger.intake;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.function.Consumer;
import org.seepledger.intake.Wishes.Topic;

/** How water flows: by one of the kinds that files give. */
final class FlowText {

    private static final String FACES = "face_flow";
    private static final String FLUX = "darcy_flux";
    private static final String GRADIENT = "head_gradient";

    private final Plan plan;
    private final Binder binder;
    private final Shelf shelf;
    private final Consumer<Finding> findings;

    FlowText(Plan plan, Binder binder, Shelf shelf, Consumer<Finding> findings) {
        this.plan = plan;
        this.binder = binder;
        this.shelf = shelf;
        this.findings = findings;
    }

    /** {@return what was said, else what there is enough of; empty if of nothing} */
    String kind() {
        String said = plan.wishes().of(Topic.FLOW);
        if (!said.isEmpty()) {
            return said;
        }
        if (has(Role.FLOW_EAST) && has(Role.FLOW_NORTH)) {
            return FACES;
        }
        if (has(Role.FLUX_X) && has(Role.FLUX_Y)) {
            return FLUX;
        }
        boolean conductivity = has(Role.CONDUCTIVITY) || plan.wishes().has(Topic.CONDUCTIVITY);
        boolean head = has(Role.HEAD) || plan.wishes().has(Topic.HEAD);
        return conductivity && head ? GRADIENT : "";
    }

    private boolean has(Role role) {
        return !binder.parts(role).isEmpty();
    }

    Map<String, Object> flow() {
        Map<String, Object> flow = new LinkedHashMap<>();
        switch (kind()) {
            case FACES -> faces(flow);
            case FLUX -> flux(flow);
            case GRADIENT -> gradient(flow);
            default ->
                findings.accept(Finding.fault(
                        Topic.FLOW,
                        "Nothing tells how water flows. Bring specific discharge along x and y, flow through the east and north"
                                + " faces of cells, or heads and conductivity."));
        }
        List<Part> masks = binder.parts(Role.ACTIVE);
        if (!masks.isEmpty()) {
            mask(masks);
        }
        return flow;
    }

    private void faces(Map<String, Object> flow) {
        flow.put("kind", FACES);
        component(flow, "east", Role.FLOW_EAST, true);
        component(flow, "north", Role.FLOW_NORTH, true);
        component(flow, "up", Role.FLOW_UP, false);
        component(flow, "west", Role.FLOW_WEST, false);
        component(flow, "south", Role.FLOW_SOUTH, false);
        component(flow, "down", Role.FLOW_DOWN, false);
    }

    private void flux(Map<String, Object> flow) {
        flow.put("kind", FLUX);
        component(flow, "x", Role.FLUX_X, true);
        component(flow, "y", Role.FLUX_Y, true);
        component(flow, "z", Role.FLUX_Z, false);
        String sides = plan.wishes().of(Topic.SIDES);
        if (!sides.isEmpty()) {
            flow.put("outer_faces", Map.of("sides", sides));
        }
    }

    private void component(Map<String, Object> flow, String key, Role role, boolean required) {
        Optional<Object> bound =
                binder.joined("flow " + key, Optional.empty(), binder.perLayer(role, Optional.empty()));
        bound.ifPresent(json -> flow.put(key, json));
        if (required && !has(role)) {
            findings.accept(Finding.fault(Topic.FLOW, "Nothing gives the flow's part " + key + ". Bring it."));
        }
    }

    private void gradient(Map<String, Object> flow) {
        flow.put("kind", GRADIENT);
        List<Optional<Bound>> plain = binder.perLayer(Role.CONDUCTIVITY, Optional.of(Topic.CONDUCTIVITY));
        Optional<Object> conductivity = binder.joined("conductivity", Optional.of(Topic.CONDUCTIVITY), plain);
        conductivity.ifPresent(json -> flow.put("conductivity", json));
        if (plain.stream().allMatch(Optional::isEmpty)) {
            findings.accept(Finding.fault(Topic.CONDUCTIVITY, "Nothing gives the conductivity. Bring it or type it."));
        }
        component(flow, "conductivity_y", Role.CONDUCTIVITY_Y, false);
        vertical(plain).ifPresent(json -> flow.put("vertical_conductivity", json));
        if (binder.layers() > 1 && !flow.containsKey("vertical_conductivity")) {
            findings.accept(Finding.fault(
                    Topic.VERTICAL_SHARE,
                    "Nothing gives the vertical conductivity, which layers above each other need. Bring it, type it, or type"
                            + " its share of the horizontal one, as 0.1."));
        }
    }

    private Optional<Object> vertical(List<Optional<Bound>> plain) {
        List<Optional<Bound>> vertical =
                binder.perLayer(Role.VERTICAL_CONDUCTIVITY, Optional.of(Topic.VERTICAL_CONDUCTIVITY));
        List<Double> shares = Numbers.of(plan.wishes().of(Topic.VERTICAL_SHARE));
        List<Optional<Bound>> all = new ArrayList<>();
        for (int layer = 0; layer < vertical.size(); layer++) {
            Optional<Bound> horizontal = plain.get(layer);
            double share = shares.isEmpty() ? Double.NaN : shares.get(Math.min(layer, shares.size() - 1));
            Optional<Bound> shared = shares.isEmpty() ? Optional.empty() : horizontal.map(bound -> bound.scaled(share));
            all.add(vertical.get(layer).or(() -> shared));
        }
        return binder.joined("vertical conductivity", Optional.of(Topic.VERTICAL_SHARE), all);
    }

    /** A cell without a value of the first part of the flow is inactive: that is where a mask is worked in. */
    private void mask(List<Part> masks) {
        Role first = switch (kind()) {
            case FACES -> Role.FLOW_EAST;
            case FLUX -> Role.FLUX_X;
            default -> Role.CONDUCTIVITY;
        };
        new Masking(binder, shelf, findings).mask(masks, binder.parts(first));
    }
}
