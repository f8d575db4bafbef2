import type { Vec } from '@/lib/geometry/vec';
import type { Job } from '@/lib/job/job-schema';
import type { Face } from '@/lib/job/numbers';
import type { Section } from '@/lib/proof/section';
import type { PlanningAnswer, PlanningRequest } from '@/lib/worker/messages';

type PlanAnswer = Exclude<PlanningAnswer, { type: 'section' }>;

export interface PlanningClient {
  /** Plans `job`; of several asked for in a row only the newest is done. */
  plan(job: Job): void;
  /** Gives up what is being planned. The worker is ended, since busy work hears no message, and a new one started. */
  cancel(): void;
  /** A section of the newest proven board; of several asked for in a row only the newest is answered. */
  section(face: Face, from: Vec, to: Vec): void;
  stop(): void;
}

export interface PlanningHost {
  /** Starts a worker of `lib/worker/planning-worker`. */
  startWorker(): Worker;
  readonly fonts: ReadonlyMap<string, ArrayBuffer>;
  onAnswer(answer: PlanAnswer): void;
  onSection(section: Section | null): void;
}

/** Work that is out of date and has run this long is given up for the newer document, ms. */
const PATIENCE = 400;

/** Keeps one planning worker at work on the newest document. */
export function createPlanningClient(host: PlanningHost): PlanningClient {
  let worker = start();
  let id = 0;
  let busySince: number | null = null;
  let waiting: Job | null = null;
  let sectionId = 0;
  let sectionBusy = false;
  let sectionWaiting: PlanningRequest | null = null;
  let impatience: ReturnType<typeof setTimeout> | null = null;

  function start(): Worker {
    const fresh = host.startWorker();
    fresh.onmessage = (event: MessageEvent<PlanningAnswer>) => answered(event.data);
    fresh.onerror = (event) => failed(event.message);
    post(fresh, { type: 'fonts', fonts: host.fonts });
    return fresh;
  }

  function restart(): void {
    worker.terminate();
    worker = start();
    busySince = null;
    sectionBusy = false;
  }

  function begin(job: Job): void {
    waiting = null;
    busySince = Date.now();
    post(worker, { type: 'plan', id: ++id, job });
  }

  function answered(answer: PlanningAnswer): void {
    if (answer.type === 'section') return sectionAnswered(answer);
    if (answer.id !== id) return;
    const isLast = answer.type !== 'progress' && answer.type !== 'paths';
    if (isLast) busySince = null;
    host.onAnswer(answer);
    if (isLast && waiting) begin(waiting);
  }

  function failed(message: string): void {
    const failedId = id;
    restart();
    host.onAnswer({ type: 'failed', id: failedId, message });
    if (waiting) begin(waiting);
  }

  function sectionAnswered(answer: Extract<PlanningAnswer, { type: 'section' }>): void {
    sectionBusy = false;
    if (answer.id === sectionId) host.onSection(answer.section);
    if (sectionWaiting) sendSection(sectionWaiting);
  }

  function sendSection(request: PlanningRequest): void {
    sectionWaiting = null;
    sectionBusy = true;
    post(worker, request);
  }

  function giveUpIfStale(): void {
    impatience = null;
    if (busySince === null || !waiting) return;
    const job = waiting;
    restart();
    begin(job);
  }

  return {
    plan(job) {
      if (busySince === null) return begin(job);
      waiting = job;
      const left = Math.max(0, PATIENCE - (Date.now() - busySince));
      impatience ??= setTimeout(giveUpIfStale, left);
    },
    cancel() {
      waiting = null;
      if (busySince === null) return;
      id++;
      restart();
    },
    section(face, from, to) {
      const request: PlanningRequest = { type: 'section', id: ++sectionId, face, from, to };
      if (sectionBusy) sectionWaiting = request;
      else sendSection(request);
    },
    stop() {
      if (impatience) clearTimeout(impatience);
      worker.terminate();
    },
  };
}

function post(worker: Worker, request: PlanningRequest): void {
  worker.postMessage(request);
}
