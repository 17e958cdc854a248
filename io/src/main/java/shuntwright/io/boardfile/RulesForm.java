package shuntwright.io.boardfile;

import shuntwright.board.DesignRules;
import shuntwright.io.form.Bounds;
import shuntwright.io.form.Fields;
import shuntwright.io.form.Form;
import shuntwright.io.form.Key;
import shuntwright.io.form.Kinds;
import shuntwright.io.form.Quantities;
import shuntwright.io.form.Sheet;
import shuntwright.quantity.Dimension;

final class RulesForm extends Form<DesignRules> {
    private static final DesignRules DEFAULT = DesignRules.DEFAULT;

    private final Key<Integer> parallelShunts = withDefault("parallelShunts", Kinds.whole(1, 8),
            DEFAULT.parallelShunts(), "most shunts in parallel in one channel");
    private final Key<Double> powerMargin = withDefault("powerMargin",
            Quantities.number(Dimension.RATIO, Bounds.POSITIVE_SHARE), DEFAULT.powerMargin(),
            "share of a shunt's rated power that may be used");
    private final Key<Double> dividerCurrent = withDefault("dividerCurrent",
            Quantities.number(Dimension.CURRENT, Bounds.POSITIVE), DEFAULT.dividerCurrent(),
            "largest current that one divider may draw from its source");
    private final Key<Double> biasShare = withDefault("biasShare",
            Quantities.number(Dimension.RATIO, Bounds.BETWEEN_ZERO_AND_ONE), DEFAULT.biasShare(),
            "largest share of the threshold by which the comparator's bias current may shift it");
    private final Key<String> resistors = optional("resistors", Kinds.name(), "any of 1 % or better, at least cost",
            "part number of the resistor series for dividers and hysteresis");
    private final Key<Double> heatStep = withDefault("heatStep",
            Quantities.number(Dimension.POWER, Bounds.NOT_NEGATIVE), DEFAULT.heatStep(),
            "heats within this much of the least count as equal when parts are chosen");
    private final Key<Double> shuntGradient = withDefault("shuntGradient",
            Quantities.number(Dimension.TEMPERATURE_DIFFERENCE, Bounds.NOT_NEGATIVE), DEFAULT.shuntGradient(),
            "temperature difference along a shunt that its thermal EMF sees");
    private final Key<Double> inputResistance = withDefault("inputResistance",
            Quantities.number(Dimension.RESISTANCE, Bounds.NOT_NEGATIVE), DEFAULT.inputResistance(),
            "resistor in each input lead of the amplifier");
    private final Key<Double> inputMismatch = withDefault("inputMismatch",
            Quantities.limit(Dimension.RATIO, Bounds.BELOW_ONE), DEFAULT.inputMismatch(),
            "mismatch of those two resistors");

    RulesForm() {
        super("Rules");
    }

    @Override
    protected DesignRules bind(Fields fields) {
        return new DesignRules(fields.get(parallelShunts), fields.get(powerMargin), fields.get(dividerCurrent),
                fields.get(biasShare), fields.find(resistors), fields.get(heatStep), fields.get(shuntGradient),
                fields.get(inputResistance),
                fields.get(inputMismatch));
    }

    @Override
    protected void fill(DesignRules value, Sheet sheet) {
        sheet.put(parallelShunts, value.parallelShunts());
        sheet.put(powerMargin, value.powerMargin());
        sheet.put(dividerCurrent, value.dividerCurrent());
        sheet.put(biasShare, value.biasShare());
        sheet.put(resistors, value.resistors());
        sheet.put(heatStep, value.heatStep());
        sheet.put(shuntGradient, value.shuntGradient());
        sheet.put(inputResistance, value.inputResistance());
        sheet.put(inputMismatch, value.inputMismatch());
    }
}
