package millrace.ui.chart;

import com.fasterxml.jackson.databind.node.ObjectNode;
import com.vaadin.flow.component.AttachEvent;
import com.vaadin.flow.component.dependency.JavaScript;
import com.vaadin.flow.component.html.Div;

/**
 * A chart. Its options are plain JSON; where they name a colour of the style sheet, as in {@code
 * var(--ink)}, the browser's own light or dark value is put in.
 */
@JavaScript(Chart.SCRIPT)
public final class Chart extends Div {
  /** Where the script is; its version is that of the build. */
  static final String SCRIPT = "context://webjars/echarts/5.3.1/dist/echarts.min.js";

  private static final long serialVersionUID = 1L;

  private static final String DRAW =
      """
      const host = this, text = $0;
      const draw = () => {
        const style = getComputedStyle(document.documentElement);
        const filled = text.replace(/var\\((--[a-z0-9-]+)\\)/g, (all, name) => style.getPropertyValue(name).trim());
        if (host.drawn) host.drawn.dispose();
        host.drawn = echarts.init(host, null, {renderer: 'svg'});
        host.drawn.setOption(JSON.parse(filled));
      };
      draw();
      new ResizeObserver(() => host.drawn && host.drawn.resize()).observe(host);
      matchMedia('(prefers-color-scheme: dark)').addEventListener('change', draw);
      window.addEventListener('beforeprint', () => host.drawn.resize());
      """;

  private final String options;

  /**
   * Makes a chart.
   *
   * @param label what it shows, in words
   * @param heightPixels height
   * @param options options of the chart library
   */
  public Chart(String label, int heightPixels, ObjectNode options) {
    this.options = options.toString();
    addClassName("chart");
    setHeight(heightPixels + "px");
    getElement().setAttribute("role", "img");
    getElement().setAttribute("aria-label", label);
  }

  @Override
  protected void onAttach(AttachEvent event) {
    super.onAttach(event);
    getElement().executeJs(DRAW, options);
  }
}
