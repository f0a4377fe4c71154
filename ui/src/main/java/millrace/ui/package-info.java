/** The dashboard's start: its call, its server, its settings. Pages are in the packages below. */
package millrace.ui;
