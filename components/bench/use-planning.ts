'use client';

import { useEffect, useMemo, useRef, useState } from 'react';
import { createPlanningClient, type PlanningClient } from '@/lib/client/bench/planning-client';
import { seenJob, type Editor } from '@/lib/editor/editor-store';
import type { Vec } from '@/lib/geometry/vec';
import type { Job } from '@/lib/job/job-schema';
import type { Face } from '@/lib/job/numbers';
import type { FontBook } from '@/lib/outline/fonts';
import type { Section } from '@/lib/proof/section';
import type { TabPlace } from '@/lib/report/intent';
import type { Problem } from '@/lib/report/problem';
import type { Report } from '@/lib/report/report';
import type { DrawnPath } from '@/lib/moves/drawn-path';
import type { FacePixels } from '@/lib/proof/face-picture';
import type { PlanningAnswer } from '@/lib/worker/messages';

/** What is known of the plan. The last results stay until newer ones are there; `current` says whether they hold. */
export interface PlanState {
  readonly stage: 'planning' | 'ready' | 'problems' | 'failed' | 'stopped';
  readonly progress: { readonly share: number; readonly what: string } | null;
  /** Whether paths, report and pictures are those of the document as it is now. */
  readonly current: boolean;
  readonly paths: readonly DrawnPath[];
  readonly tabs: readonly TabPlace[];
  readonly report: Report | null;
  readonly pictures: Readonly<Record<Face, FacePixels | null>>;
  readonly problems: readonly Problem[];
  readonly message: string | null;
}

export interface Planning extends PlanState {
  readonly section: Section | null;
  askSection(face: Face, from: Vec, to: Vec): void;
  cancel(): void;
  retry(): void;
}

const START: PlanState = {
  stage: 'planning',
  progress: null,
  current: false,
  paths: [],
  tabs: [],
  report: null,
  pictures: { A: null, B: null },
  problems: [],
  message: null,
};

/** A drag sends many documents; this many a second are enough for the eye, ms between two. */
const PACE = 60;

/** Plans the document as it is seen, in a worker, whenever it changes. */
export function usePlanning(editor: Editor, fonts: FontBook): Planning {
  const [state, setState] = useState(START);
  const [section, setSection] = useState<Section | null>(null);
  const client = useRef<PlanningClient | null>(null);
  const planNow = useRef<() => void>(() => undefined);

  useEffect(() => {
    const planning = createPlanningClient({
      fonts,
      startWorker: () =>
        new Worker(new URL('../../lib/worker/planning-worker.ts', import.meta.url), { type: 'module' }),
      onAnswer: (answer) => setState((before) => taken(before, answer)),
      onSection: setSection,
    });
    client.current = planning;
    let planned: Job | null = null;
    let timer: ReturnType<typeof setTimeout> | null = null;
    const start = (): void => {
      timer = null;
      planned = seenJob(editor.store.getState());
      setState((before) => ({ ...before, stage: 'planning', current: false, progress: null }));
      planning.plan(planned);
    };
    planNow.current = start;
    start();
    const stopListening = editor.store.subscribe((next) => {
      if (seenJob(next) !== planned && timer === null) timer = setTimeout(start, PACE);
    });
    return () => {
      stopListening();
      if (timer) clearTimeout(timer);
      planning.stop();
      client.current = null;
    };
  }, [editor, fonts]);

  return useMemo(
    () => ({
      ...state,
      section,
      askSection: (face, from, to) => client.current?.section(face, from, to),
      cancel() {
        client.current?.cancel();
        setState((before) => ({ ...before, stage: 'stopped', progress: null }));
      },
      retry: () => planNow.current(),
    }),
    [state, section],
  );
}

/** The state after an answer of the worker. */
function taken(before: PlanState, answer: Exclude<PlanningAnswer, { type: 'section' }>): PlanState {
  switch (answer.type) {
    case 'progress':
      return { ...before, progress: { share: answer.share, what: answer.what } };
    case 'paths':
      return { ...before, paths: answer.paths, tabs: answer.tabs, current: true };
    case 'proof': {
      const { report, pictures } = answer;
      return { ...before, stage: 'ready', progress: null, current: true, report, pictures, problems: [] };
    }
    case 'problems':
      return { ...START, stage: 'problems', problems: answer.problems };
    case 'failed':
      return { ...before, stage: 'failed', progress: null, message: answer.message };
  }
}
