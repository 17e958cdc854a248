package shuntwright.choice;

import java.util.List;
import java.util.Optional;

import shuntwright.board.Acceptance;
import shuntwright.board.Channel;
import shuntwright.board.Demand;
import shuntwright.circuit.SourceVoltage;
import shuntwright.circuit.Surroundings;
import shuntwright.circuit.Threshold;
import shuntwright.parts.Catalogue;
import shuntwright.parts.ResistorSeries;

/**
 * Everything the choice for one channel depends on; two equal problems have equal answers.
 *
 * @param demand        what is asked
 * @param around        supply, ambient, rules, ADC
 * @param catalogue     parts
 * @param sources       sources its own divider may start from; empty when a tap is used
 * @param tap           the threshold of the tap it uses; empty for an own divider
 * @param resistors     resistor series that may be used, cheapest first
 * @param pullUp        of its output
 * @param acceptance    what counts as accepted
 * @param buildQuantity boards built at once
 */
public record ChannelProblem(Demand demand, Surroundings around, Catalogue catalogue, List<SourceVoltage> sources,
        Optional<Threshold> tap, List<ResistorSeries> resistors, PullUp pullUp, Acceptance acceptance,
        int buildQuantity) {

    public ChannelProblem {
        sources = List.copyOf(sources);
        resistors = List.copyOf(resistors);
    }

    /**
     * The same problem without what the choice does not depend on: name, note, alert line of the channel, and which zone warms it. Channels
     * with the same demand have one anonymous problem, and so one choice.
     */
    public ChannelProblem anonymous() {
        Channel c = demand.channel();
        Channel bare = new Channel("", "", c.rail(), c.side(), c.currents(), c.release(), c.reading(), c.threshold(),
                Optional.empty(), Optional.empty(), c.diversity(), c.stress(), c.pins());
        Demand same = new Demand(bare, demand.commonMode(), demand.load(), demand.tripWindow(), demand.tripTarget(),
                demand.rearm(), demand.fullScale());
        Surroundings nameless = around
                .withZone(around.zone().map(each -> new Surroundings.ZoneRise("", each.most())));
        return new ChannelProblem(same, nameless, catalogue, sources, tap, resistors, pullUp, acceptance,
                buildQuantity);
    }

    /** The same with a zone that is not warmed. */
    ChannelProblem atAmbient() {
        return new ChannelProblem(demand, around.withZone(Optional.empty()), catalogue, sources, tap, resistors, pullUp,
                acceptance, buildQuantity);
    }
}
