package shuntwright.planner.window;

import javafx.application.ColorScheme;
import javafx.beans.property.ObjectProperty;
import javafx.beans.property.ReadOnlyObjectProperty;
import javafx.beans.property.ReadOnlyObjectWrapper;
import javafx.beans.property.SimpleObjectProperty;
import javafx.beans.value.ObservableValue;

/** Light, dark, or as the system is. */
final class ThemeChoice {
    /** What a person may choose. */
    enum Wish {
        SYSTEM("As the system"), LIGHT("Light"), DARK("Dark");

        private final String words;

        Wish(String words) {
            this.words = words;
        }

        String words() {
            return words;
        }
    }

    private final ObjectProperty<Wish> wish = new SimpleObjectProperty<>(Wish.SYSTEM);
    private final ReadOnlyObjectWrapper<Theme> theme = new ReadOnlyObjectWrapper<>(Theme.LIGHT);
    private final ObservableValue<ColorScheme> system;

    ThemeChoice(ObservableValue<ColorScheme> system) {
        this.system = system;
        wish.subscribe(this::refresh);
        system.subscribe(_ -> refresh());
        refresh();
    }

    private void refresh() {
        theme.set(switch (wish.get()) {
            case SYSTEM -> Theme.of(system.getValue());
            case LIGHT -> Theme.LIGHT;
            case DARK -> Theme.DARK;
        });
    }

    ObjectProperty<Wish> wishProperty() {
        return wish;
    }

    ReadOnlyObjectProperty<Theme> themeProperty() {
        return theme.getReadOnlyProperty();
    }
}
