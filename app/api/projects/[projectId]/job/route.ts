import { ENDPOINTS } from '@/lib/contracts/endpoints';
import { route } from '@/lib/server/http/route';
import { jobAnswer, savedAnswer } from '@/lib/server/projects/job-answer';
import { readJob, saveJob } from '@/lib/server/projects/saved-job';

export const GET = route(ENDPOINTS.getJob, async ({ em, project, request }) =>
  jobAnswer(await readJob(em, project), request.headers.get('if-none-match')),
);
export const PUT = route(ENDPOINTS.saveJob, async ({ em, project, request, body }) =>
  savedAnswer(await saveJob(em, project, request.headers.get('if-match'), body)),
);
