/** The month: rates of the hospital and its units, drug classes, and how far to trust them. */
package millrace.ui.month;
