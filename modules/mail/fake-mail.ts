import { z } from 'zod';
import type { UtcMilliseconds } from '../units';

/** Name of a mail file: six digits or more, so that no path can hide in it. */
export const fakeMailNameSchema = z.string().regex(/^\d{6,12}\.eml$/);

/** A line of the list of mails that the local fake kept. */
export interface FakeMailSummary {
  readonly name: string;
  readonly to: string;
  readonly subject: string;
  /** The Date header. */
  readonly sentAtUtc: UtcMilliseconds | null;
  readonly attachmentNames: readonly string[];
}

export interface FakeMailAttachment {
  readonly name: string;
  readonly contentType: string;
  readonly sizeBytes: number;
  /** The content of a text file such as the calendar, null for anything else. */
  readonly text: string | null;
}

/** One kept mail in full. The HTML is a stranger's page: show it in a sandboxed frame only. */
export interface FakeMail extends FakeMailSummary {
  readonly text: string;
  readonly html: string | null;
  readonly attachments: readonly FakeMailAttachment[];
}
