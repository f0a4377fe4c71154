package millrace.sampledata.person;

/** The three populations a patient may belong to for life. */
public enum Population {
  /** Adults who come for medicine, surgery or cancer. */
  GENERAL,
  /** Women who come to give birth. */
  MATERNITY,
  /** Children, under age at every admission. */
  CHILD
}
