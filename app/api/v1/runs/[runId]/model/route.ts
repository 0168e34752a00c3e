import { z } from 'zod';
import { endpoint } from '@/app/_endpoint';
import { textFileResponse } from '@/app/_text-file';
import { readRunModel } from '@/modules/roster/server';
import { idSchema } from '@/modules/units';

export const GET = endpoint({
  need: 'rosters.read',
  params: z.object({ runId: idSchema('run') }),
  run: ({ actor, params }) => {
    const file = readRunModel(actor, params.runId);
    return file.ok ? textFileResponse(file.value, 'text/plain; charset=utf-8') : file;
  },
});
