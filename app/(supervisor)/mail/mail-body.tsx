import type { ReactNode } from 'react';
import type { FakeMail } from '@/modules/mail';
import type { Zone } from '@/modules/units';
import { Attachment } from './attachment';
import { frameDocument } from './frame-document';

interface Props {
  readonly mail: FakeMail;
  readonly zone: Zone;
}

/** The HTML in a frame that may do nothing, the plain text beside it, and the attachments. */
export function MailBody({ mail, zone }: Props) {
  return (
    <>
      {mail.html === null ? null : (
        <>
          <iframe
            title={`Mail to ${mail.to}: ${mail.subject}`}
            sandbox=""
            srcDoc={frameDocument(mail.html)}
            className="block h-[36rem] w-full border border-edge bg-white"
          />
          <p className="mt-1 text-second text-ink3">
            Links do nothing in this frame; the plain text has their addresses.
          </p>
        </>
      )}
      <Part title="The same as plain text">
        <pre className="max-w-full overflow-x-auto whitespace-pre-wrap break-words font-words text-body">
          {mail.text}
        </pre>
      </Part>
      <Part title="Attached">
        {mail.attachments.length === 0 ? <p className="text-body">Nothing.</p> : null}
        {mail.attachments.map((attachment) => (
          <Attachment
            key={`${attachment.name} ${attachment.contentType}`}
            attachment={attachment}
            zone={zone}
          />
        ))}
      </Part>
    </>
  );
}

function Part({ title, children }: { readonly title: string; readonly children: ReactNode }) {
  return (
    <section className="mt-5">
      <h3 className="line-group mb-2 pb-1 text-head font-[660]">{title}</h3>
      {children}
    </section>
  );
}
