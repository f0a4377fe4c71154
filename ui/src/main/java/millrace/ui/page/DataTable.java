package millrace.ui.page;

import com.vaadin.flow.component.Component;
import com.vaadin.flow.component.html.Div;
import com.vaadin.flow.dom.Element;

/** A table that scrolls inside itself; the first columns hold words, the others numbers. */
public final class DataTable extends Div {
  private static final long serialVersionUID = 1L;

  private final Element body = new Element("tbody");
  private final int words;

  /**
   * Makes the head.
   *
   * @param caption what the table holds, for readers that do not see it
   * @param words how many first columns hold words
   * @param heads column heads
   */
  public DataTable(String caption, int words, String... heads) {
    this.words = words;
    addClassName("table");
    getElement().setAttribute("tabindex", "0");
    getElement().setAttribute("role", "region");
    getElement().setAttribute("aria-label", caption);
    Element row = new Element("tr");
    for (int i = 0; i < heads.length; i++) {
      Element head = new Element("th").setText(heads[i]).setAttribute("scope", "col");
      row.appendChild(i < words ? head.setAttribute("class", "w") : head);
    }
    Element table = new Element("table");
    table.appendChild(new Element("thead").appendChild(row), body);
    getElement().appendChild(table);
  }

  /** Adds a row of texts and components. */
  public DataTable row(Object... cells) {
    Element row = new Element("tr");
    for (int i = 0; i < cells.length; i++) {
      Element cell = new Element("td");
      if (i < words) {
        cell.setAttribute("class", "w");
      }
      if (cells[i] instanceof Component component) {
        cell.appendChild(component.getElement());
      } else {
        cell.setText(String.valueOf(cells[i]));
      }
      row.appendChild(cell);
    }
    body.appendChild(row);
    return this;
  }
}
