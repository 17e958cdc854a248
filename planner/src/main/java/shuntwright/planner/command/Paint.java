package shuntwright.planner.command;

import java.util.function.UnaryOperator;

import shuntwright.plan.ChannelPlan;
import shuntwright.plan.Finding;

/** Colours for a terminal; every coloured word also says by itself what it means. */
enum Paint {
    GREEN(32), YELLOW(33), RED(31);

    private final int code;

    Paint(int code) {
        this.code = code;
    }

    static UnaryOperator<String> of(ChannelPlan channel, boolean colour) {
        Paint paint = switch (channel.verdict()) {
            case INSIDE -> channel.accepted() ? GREEN : RED;
            case LIKELY -> channel.accepted() ? YELLOW : RED;
            case OUTSIDE, NO_FIT, INCOMPLETE -> RED;
        };
        return paint.when(colour);
    }

    static UnaryOperator<String> of(Finding.Severity severity, boolean colour) {
        return switch (severity) {
            case NOTE -> UnaryOperator.identity();
            case WARNING -> YELLOW.when(colour);
            case FAULT -> RED.when(colour);
        };
    }

    private UnaryOperator<String> when(boolean colour) {
        return colour ? text -> "\u001b[" + code + "m" + text + "\u001b[0m" : UnaryOperator.identity();
    }
}
