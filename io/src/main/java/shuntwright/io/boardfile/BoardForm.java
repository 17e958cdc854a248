package shuntwright.io.boardfile;

import java.util.List;

import shuntwright.board.Acceptance;
import shuntwright.board.Adc;
import shuntwright.board.AlertLine;
import shuntwright.board.Board;
import shuntwright.board.BoardReference;
import shuntwright.board.Channel;
import shuntwright.board.DesignRules;
import shuntwright.board.Preference;
import shuntwright.board.SenseSupply;
import shuntwright.board.Tap;
import shuntwright.board.Uncertainty;
import shuntwright.board.Zone;
import shuntwright.io.form.Bounds;
import shuntwright.io.form.Fields;
import shuntwright.io.form.Form;
import shuntwright.io.form.Key;
import shuntwright.io.form.Kinds;
import shuntwright.io.form.Quantities;
import shuntwright.io.form.Sheet;
import shuntwright.quantity.Dimension;
import shuntwright.quantity.Range;

final class BoardForm extends Form<Board> {
    static final Bounds PHYSICAL_TEMPERATURE = new Bounds(-273.15, true, Double.POSITIVE_INFINITY, false);

    private final SupplyForm supplyForm = new SupplyForm();
    private final ReferenceForm referenceForm = new ReferenceForm();
    private final AdcForm adcForm = new AdcForm();
    private final AlertLineForm alertLineForm = new AlertLineForm();
    private final TapForm tapForm = new TapForm();
    private final ZoneForm zoneForm = new ZoneForm();
    private final AcceptanceForm acceptanceForm = new AcceptanceForm();
    private final RulesForm rulesForm = new RulesForm();
    private final UncertaintyForm uncertaintyForm = new UncertaintyForm();
    private final PreferenceForm preferenceForm = new PreferenceForm();
    private final ChannelForm channelForm = new ChannelForm();

    private final Key<String> format = required("format", BoardFiles.FORMAT.kind(), "kind and version of the file");
    private final Key<String> name = required("name", Kinds.text(), "shown in titles and exports");
    private final Key<String> description = withDefault("description", Kinds.text(), "", "free text");
    private final Key<List<String>> parts = withDefault("parts", Kinds.list(Kinds.name()), List.of(),
            "parts files to use, relative to the board file");
    private final Key<Integer> buildQuantity = withDefault("buildQuantity", Kinds.whole(1, Integer.MAX_VALUE), 1,
            "boards built at once; decides the price breaks");
    private final Key<Range> ambient = withDefault("ambient",
            Quantities.range(Dimension.TEMPERATURE, PHYSICAL_TEMPERATURE), Board.DEFAULT_AMBIENT,
            "temperature of the air around the parts");
    private final Key<SenseSupply> supply = withDefault("supply", supplyForm, SenseSupply.DEFAULT,
            "feeds amplifiers, comparators and dividers");
    private final Key<List<BoardReference>> references = withDefault("references", Kinds.list(referenceForm), List.of(),
            "precision references on the board");
    private final Key<Adc> adc = optional("adc", adcForm, "nothing is read", "reads the amplifier outputs");
    private final Key<List<AlertLine>> alertLines = withDefault("alertLines", Kinds.list(alertLineForm), List.of(),
            "lines that comparators pull low");
    private final Key<List<Tap>> taps = withDefault("taps", Kinds.list(tapForm), List.of(),
            "thresholds that several channels share");
    private final Key<List<Zone>> zones = withDefault("zones", Kinds.list(zoneForm), List.of(),
            "areas of the board with a heat limit or a warming of their own");
    private final Key<Double> heatLimit = optional("heatLimit", Quantities.number(Dimension.POWER, Bounds.POSITIVE),
            "no limit", "largest heat of all shunts together");
    private final Key<Acceptance> acceptance = withDefault("acceptance", acceptanceForm, Acceptance.DEFAULT,
            "when a channel counts as accepted");
    private final Key<DesignRules> rules = withDefault("rules", rulesForm, DesignRules.DEFAULT,
            "design rules for every channel");
    private final Key<Uncertainty> uncertainty = withDefault("uncertainty", uncertaintyForm, Uncertainty.DEFAULT,
            "what is known of the inputs beyond their limits, and how distributions are propagated");
    private final Key<Preference> preference = withDefault("preference", preferenceForm, Preference.DEFAULT,
            "what is wanted of all choices that serve, and how long it is looked for");
    private final Key<List<Channel>> channels = withDefault("channels", Kinds.list(channelForm), List.of(),
            "one for each output rail");

    BoardForm() {
        super("Board");
    }

    List<Form<?>> all() {
        return List.of(this, supplyForm, referenceForm, adcForm, alertLineForm, tapForm, tapForm.dividerForm,
                tapForm.dacForm, zoneForm, acceptanceForm, rulesForm, uncertaintyForm, uncertaintyForm.distributionForm,
                preferenceForm,
                channelForm, channelForm.calibrationForm, channelForm.withstandForm,
                channelForm.withstandForm.conductorForm,
                channelForm.pinsForm);
    }

    @Override
    protected Board bind(Fields fields) {
        return new Board(fields.get(name), fields.get(description), fields.get(parts), fields.get(buildQuantity),
                fields.get(ambient), fields.get(supply), fields.get(references), fields.find(adc),
                fields.get(alertLines), fields.get(taps), fields.get(zones), fields.number(heatLimit),
                fields.get(acceptance), fields.get(rules), fields.get(uncertainty), fields.get(preference),
                fields.get(channels));
    }

    @Override
    protected void fill(Board value, Sheet sheet) {
        sheet.put(format, BoardFiles.FORMAT.text());
        sheet.put(name, value.name());
        sheet.put(description, value.description());
        sheet.put(parts, value.partsFiles());
        sheet.put(buildQuantity, value.buildQuantity());
        sheet.put(ambient, value.ambient());
        sheet.put(supply, value.supply());
        sheet.put(references, value.references());
        sheet.put(adc, value.adc());
        sheet.put(alertLines, value.alertLines());
        sheet.put(taps, value.taps());
        sheet.put(zones, value.zones());
        sheet.put(heatLimit, value.heatLimit());
        sheet.put(acceptance, value.acceptance());
        sheet.put(rules, value.rules());
        sheet.put(uncertainty, value.uncertainty());
        sheet.put(preference, value.preference());
        sheet.put(channels, value.channels());
    }
}
