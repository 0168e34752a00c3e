/**
 * Stands in front of a mail's own markup: nothing is fetched from anywhere, and links lead out of the
 * frame, which the sandbox then forbids. A policy counts for all that comes after it; a second doctype
 * and head are skipped by the parser (HTML Standard, 13.2.6.4), their content stays.
 */
const guard =
  '<!doctype html><head>' +
  '<meta http-equiv="Content-Security-Policy" content="default-src \'none\'; style-src \'unsafe-inline\'; img-src data:">' +
  '<base target="_blank"></head>';

/** The document of a sandboxed frame that shows a mail's HTML. */
export const frameDocument = (html: string): string => guard + html;
