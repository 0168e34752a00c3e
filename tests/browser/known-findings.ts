/** A finding of axe in the markup of a library that we cannot change. */
export interface KnownFinding {
  /** The axe rule. */
  readonly rule: string;
  /** Part of the CSS path that axe gives. */
  readonly selector: string;
  readonly reason: string;
}

/**
 * Findings that the accessibility scan lets pass, each by rule and place. Empty: what react-big-calendar's
 * own markup would bring is replaced through its `components` (cells, heads, blocks) or not drawn at all
 * (the row for whole days, the agenda's heads in a table of their own). A new finding there is mended in
 * `app/_ui/calendar` or listed here with its reason.
 */
export const knownFindings: readonly KnownFinding[] = [];
