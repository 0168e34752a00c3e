import type { ReactElement } from 'react';

/** A mail in both of its forms; they carry the same facts. */
export interface MailContent {
  readonly subject: string;
  readonly html: string;
  readonly text: string;
}

/**
 * The HTML document of a template. react-dom/server is imported when needed: the page build refuses it
 * as a static import of anything a route reaches.
 */
export async function renderDocument(document: ReactElement): Promise<string> {
  const { renderToStaticMarkup } = await import('react-dom/server');
  return `<!doctype html>\n${renderToStaticMarkup(document)}\n`;
}
