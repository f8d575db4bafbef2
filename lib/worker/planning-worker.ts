import { planPaths } from '@/lib/pipeline/plan-paths';
import { proveAndReport, type PlanResult } from '@/lib/pipeline/plan-job';
import type { Job } from '@/lib/job/job-schema';
import type { FontBook } from '@/lib/outline/fonts';
import { sectionAlong } from '@/lib/proof/section';
import { drawnPath } from '@/lib/moves/drawn-path';
import { facePixels } from '@/lib/proof/face-picture';
import type { PlanningAnswer, PlanningRequest } from './messages';

/**
 * The browser's planning thread: takes documents, answers with paths first and the proof after, keeps the newest board
 * to cut sections from. It does one thing at a time; who has no more use for it ends it.
 */
let fonts: FontBook = new Map();
let result: PlanResult | null = null;

const post = (answer: PlanningAnswer): void => self.postMessage(answer);

self.onmessage = (event: MessageEvent<PlanningRequest>): void => {
  const request = event.data;
  switch (request.type) {
    case 'fonts':
      fonts = request.fonts;
      break;
    case 'plan':
      plan(request.id, request.job);
      break;
    case 'section': {
      const { id, face, from, to } = request;
      post({ type: 'section', id, section: result ? sectionAlong(result.board, from, to, face) : null });
    }
  }
};

function plan(id: number, job: Job): void {
  try {
    const control = {
      onProgress: (share: number, what: string) => post({ type: 'progress', id, share, what }),
    };
    const paths = planPaths(job, fonts, control);
    if (!paths.ok) return post({ type: 'problems', id, problems: paths.error });
    post({ type: 'paths', id, paths: paths.value.steps.map(drawnPath), tabs: paths.value.tabs });
    result = proveAndReport(paths.value, control);
    const { report, board } = result;
    const pictures = { A: facePixels(board, 'A'), B: facePixels(board, 'B') };
    post({ type: 'proof', id, report, pictures });
  } catch (error) {
    post({ type: 'failed', id, message: error instanceof Error ? error.message : 'Planning failed.' });
  }
}
