/** A text file to be saved, never shown or kept in between. `fileName` holds ASCII letters and figures. */
export function textFileResponse(
  { fileName, text }: { readonly fileName: string; readonly text: string },
  contentType: string,
): Response {
  return new Response(text, {
    headers: {
      'content-type': contentType,
      'content-disposition': `attachment; filename="${fileName}"`,
      'cache-control': 'no-store',
      'x-content-type-options': 'nosniff',
    },
  });
}
