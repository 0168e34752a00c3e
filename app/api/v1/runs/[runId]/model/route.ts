import { z } from 'zod';
import { endpoint } from '@/app/_endpoint';
import { textFileResponse } from '@/app/_text-file';
import { modelQuerySchema } from '@/modules/roster';
import { readRunModel } from '@/modules/roster/server';
import { idSchema } from '@/modules/units';

export const GET = endpoint({
  need: 'rosters.read',
  params: z.object({ runId: idSchema('run') }),
  query: modelQuerySchema,
  run: ({ actor, params, query }) => {
    const file = readRunModel(actor, params.runId, query.format);
    return file.ok ? textFileResponse(file.value, 'text/plain; charset=utf-8') : file;
  },
});
