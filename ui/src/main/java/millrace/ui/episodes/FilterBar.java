package millrace.ui.episodes;

import com.vaadin.flow.component.html.Div;
import com.vaadin.flow.dom.Element;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import millrace.analytics.mart.UnitRow;
import millrace.ui.page.Query;

/**
 * A plain form whose values become the address; it works without anything of its own in the
 * browser.
 */
final class FilterBar extends Div {
  private static final long serialVersionUID = 1L;

  FilterBar(EpisodeFilter filter, List<UnitRow> units) {
    Element form =
        new Element("form")
            .setAttribute("action", "episodes")
            .setAttribute("method", "get")
            .setAttribute("class", "filters")
            .setAttribute("aria-label", "Filters");
    Element month =
        new Element("input")
            .setAttribute("name", "month")
            .setAttribute("size", "8")
            .setAttribute("placeholder", "2031-03")
            .setAttribute("pattern", "[0-9]{4}-[0-9]{2}")
            .setAttribute("value", filter.month().map(Object::toString).orElse(""));
    form.appendChild(labelled("month", month));
    Map<String, String> names = new LinkedHashMap<>();
    units.forEach(u -> names.put(u.unitId(), u.name()));
    form.appendChild(select("unit", "unit", filter.unit(), names));
    form.appendChild(select("stage", "stage", filter.stage(), same(EpisodeFilter.STAGES)));
    form.appendChild(select("origin", "origin", filter.origin(), same(EpisodeFilter.ORIGINS)));
    form.appendChild(select("class", "class", filter.cohortClass(), same(EpisodeFilter.CLASSES)));
    form.appendChild(
        select(
            "recent hypotension",
            "recent-hypotension",
            Query.word(filter.recentHypotension()),
            same(List.of("yes", "no"))));
    form.appendChild(
        select("counted", "counted", Query.word(filter.counted()), same(List.of("yes", "no"))));
    hidden(form, "attribution", filter.attribution());
    hidden(form, "drug", filter.drugClass());
    hidden(form, "linked", Query.word(filter.linked()));
    form.appendChild(new Element("button").setAttribute("type", "submit").setText("Show"));
    form.appendChild(new Element("a").setAttribute("href", "episodes").setText("all episodes"));
    getElement().appendChild(form);
  }

  private static Map<String, String> same(List<String> words) {
    Map<String, String> names = new LinkedHashMap<>();
    words.forEach(w -> names.put(w, w.replace('-', ' ')));
    return names;
  }

  private static void hidden(Element form, String name, Optional<String> value) {
    value.ifPresent(
        v ->
            form.appendChild(
                new Element("input")
                    .setAttribute("type", "hidden")
                    .setAttribute("name", name)
                    .setAttribute("value", v)));
  }

  private static Element select(
      String label, String name, Optional<String> chosen, Map<String, String> options) {
    Element select = new Element("select").setAttribute("name", name);
    select.appendChild(new Element("option").setAttribute("value", "").setText("any"));
    options.forEach(
        (value, text) -> {
          Element option = new Element("option").setAttribute("value", value).setText(text);
          if (chosen.filter(value::equals).isPresent()) {
            option.setAttribute("selected", true);
          }
          select.appendChild(option);
        });
    return labelled(label, select);
  }

  private static Element labelled(String label, Element field) {
    Element text = new Element("span").setText(label);
    return new Element("label").appendChild(text, field);
  }
}
