/** Charts: their options as JSON text, and the component that shows them. */
package millrace.ui.chart;
