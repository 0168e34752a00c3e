import { z } from 'zod';
import { endpoint } from '@/app/_endpoint';
import { textFileResponse } from '@/app/_text-file';
import { exportHoursCsv } from '@/modules/hours/server';
import { dateRangeSchema, idSchema } from '@/modules/units';

export const GET = endpoint({
  need: 'hours.read',
  params: z.object({ teamId: idSchema('tea') }),
  query: dateRangeSchema,
  run: ({ actor, params, query }) => {
    const file = exportHoursCsv(actor, params.teamId, query);
    // RFC 4180, section 3: the header line is announced.
    return file.ok ? textFileResponse(file.value, 'text/csv; charset=utf-8; header=present') : file;
  },
});
