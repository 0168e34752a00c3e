import type { ReactNode } from 'react';
import { fontFamily, paper, small } from './paper';

interface Props {
  readonly title: string;
  readonly organisationName: string;
  readonly footer: string;
  readonly children: ReactNode;
}

/** The document every mail is: a sheet in the middle of the page, laid out by tables for old programs. */
export function MailFrame({ title, ...sheet }: Props) {
  return (
    <html lang="en">
      {/* biome-ignore lint/style/noHeadElement: a mail is a whole document, not a page of the site */}
      <head>
        <meta charSet="utf-8" />
        <meta name="viewport" content="width=device-width, initial-scale=1" />
        <meta name="color-scheme" content="light" />
        <title>{title}</title>
      </head>
      <body style={{ margin: 0, padding: 0, backgroundColor: paper.recess }}>
        <table
          role="presentation"
          width="100%"
          cellPadding={0}
          cellSpacing={0}
          style={{ backgroundColor: paper.recess }}
        >
          <tbody>
            <tr>
              <td align="center" style={{ padding: '24px 4px' }}>
                <Sheet {...sheet} />
              </td>
            </tr>
          </tbody>
        </table>
      </body>
    </html>
  );
}

/** Name and organisation, the floor line, content, small print. */
function Sheet({ organisationName, footer, children }: Omit<Props, 'title'>) {
  return (
    <table
      role="presentation"
      width="600"
      cellPadding={0}
      cellSpacing={0}
      style={{
        width: '100%',
        maxWidth: 600,
        backgroundColor: paper.sheet,
        border: `1px solid ${paper.ink}`,
        color: paper.ink,
        fontFamily,
        textAlign: 'left',
      }}
    >
      <tbody>
        <tr>
          <td style={{ padding: '18px 12px', borderBottom: `5px solid ${paper.ink}` }}>
            <strong style={{ fontSize: 17 }}>Floorwright</strong>
            <span style={{ ...small, paddingLeft: 12 }}>{organisationName}</span>
          </td>
        </tr>
        <tr>
          <td style={{ padding: '24px 12px 8px' }}>{children}</td>
        </tr>
        <tr>
          <td style={{ ...small, padding: '14px 12px 20px' }}>{footer}</td>
        </tr>
      </tbody>
    </table>
  );
}
