package shuntwright.io.partsfile;

import java.util.List;

import shuntwright.io.form.Bounds;
import shuntwright.io.form.Fields;
import shuntwright.io.form.Form;
import shuntwright.io.form.Key;
import shuntwright.io.form.Kind;
import shuntwright.io.form.Kinds;
import shuntwright.io.form.PairKind;
import shuntwright.io.form.Sheet;
import shuntwright.parts.Part;
import shuntwright.parts.PriceBreak;
import shuntwright.parts.Purchase;

/**
 * The layout of a part: its number and description, keys of its own kind, and at the end how it is sold.
 *
 * @param <P> kind of part
 */
abstract class PartForm<P extends Part> extends Form<P> {
    private static final Kind<List<PriceBreak>> PRICES = Kinds.list(new PairKind<>("[quantity, price]",
            Kinds.whole(1, Integer.MAX_VALUE), Kinds.bare("price of one piece", Bounds.NOT_NEGATIVE), PriceBreak::new,
            PriceBreak::quantity, PriceBreak::unitPrice));

    private final Key<String> partNumber = required("partNumber", Kinds.name(),
            "unique among all parts files of a board");
    private final Key<String> description = withDefault("description", Kinds.text(), "",
            "free text for the parts list");

    PartForm(String title) {
        super(title);
    }

    /** The keys that say how the part is sold; each form makes them last and keeps them. */
    final SaleKeys makeSaleKeys() {
        return new SaleKeys(withDefault("body", Kinds.text(), "", "package or case"),
                withDefault("prices", PRICES, List.of(),
                        "price of one piece from each order quantity upwards, the first from 1"),
                withDefault("pack", Kinds.whole(1, Integer.MAX_VALUE), 1, "pieces in one pack; orders are whole packs"),
                withDefault("minimumOrder", Kinds.whole(1, Integer.MAX_VALUE), 1, "smallest order in pieces"),
                withDefault("supplier", Kinds.text(), "", "free text"),
                withDefault("lifecycle", Kinds.text(), "", "free text, for example `active`"));
    }

    abstract SaleKeys saleKeys();

    final String partNumber(Fields fields) {
        return fields.get(partNumber);
    }

    final String description(Fields fields) {
        return fields.get(description);
    }

    final Purchase purchase(Fields fields) {
        return saleKeys().bind(fields);
    }

    @Override
    protected void check(Fields fields) {
        saleKeys().check(fields);
    }

    @Override
    protected final void fill(P value, Sheet sheet) {
        sheet.put(partNumber, value.partNumber());
        sheet.put(description, value.description());
        fillOwn(value, sheet);
        saleKeys().fill(value.purchase(), sheet);
    }

    /** Puts what only this kind of part has onto the sheet. */
    abstract void fillOwn(P value, Sheet sheet);

    /** The keys that every part has for its purchase. */
    record SaleKeys(Key<String> body, Key<List<PriceBreak>> prices, Key<Integer> pack, Key<Integer> minimumOrder,
            Key<String> supplier, Key<String> lifecycle) {
        private void check(Fields fields) {
            int last = 0;
            for (PriceBreak each : fields.find(prices).orElse(List.of())) {
                if (each.quantity() <= last || (last == 0 && each.quantity() != 1)) {
                    fields.problem(prices, "the quantities of price breaks must start at 1 and ascend, but "
                            + each.quantity() + (last == 0 ? " stands first" : " stands behind " + last));
                    return;
                }
                last = each.quantity();
            }
        }

        private Purchase bind(Fields fields) {
            return new Purchase(fields.get(body), fields.get(prices), fields.get(pack), fields.get(minimumOrder),
                    fields.get(supplier), fields.get(lifecycle));
        }

        private void fill(Purchase value, Sheet sheet) {
            sheet.put(body, value.body());
            sheet.put(prices, value.prices());
            sheet.put(pack, value.packSize());
            sheet.put(minimumOrder, value.minimumOrder());
            sheet.put(supplier, value.supplier());
            sheet.put(lifecycle, value.lifecycle());
        }
    }
}
