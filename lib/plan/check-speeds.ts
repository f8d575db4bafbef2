import type { Cut } from '@/lib/job/cut-schema';
import { cutSpeeds, cutterOf } from '@/lib/job/cut-values';
import type { Job } from '@/lib/job/job-schema';
import { makeFinding } from '@/lib/report/make-finding';
import type { Finding } from '@/lib/report/report';

/** Chips thinner than this burn, thicker ones break the cutter, mm a tooth (common practice, no source). */
const CHIP_LOAD = { least: 0.01, most: 0.3 };

/** Feeds and speeds that the machine or the cutter is not made for; the plan uses the machine's limit instead. */
export function checkSpeeds(job: Job, cut: Cut): Finding[] {
  const { feed, plunge, rpm } = cutSpeeds(job, cut);
  const { feedMax, spindle } = job.machine;
  const cutter = cutterOf(job, cut);
  const name = `'${cut.name || cut.id}'`;
  const about = { cut: cut.id, face: cut.face };
  const findings: Finding[] = [];
  if (feed > feedMax.xy || plunge > feedMax.z) {
    const [asked, most, what] =
      feed > feedMax.xy ? [feed, feedMax.xy, 'feed'] : [plunge, feedMax.z, 'plunge feed'];
    const message = `${name} asks for a ${what} of ${asked} mm/min; the machine's limit of ${most} is used.`;
    findings.push(makeFinding('feed-too-high', message, about));
  }
  const turns = Math.min(Math.max(rpm, spindle.min), spindle.max);
  if (turns !== rpm) {
    const message = `${name} asks for ${rpm} rpm; the spindle turns ${spindle.min} to ${spindle.max}, so ${turns} is used.`;
    findings.push(makeFinding('speed-out-of-range', message, about));
  }
  const chip = Math.min(feed, feedMax.xy) / (turns * cutter.flutes);
  if (cutter.kind !== 'drill' && (chip < CHIP_LOAD.least || chip > CHIP_LOAD.most)) {
    const message = `${name}: ${cutter.name} would cut ${chip.toPrecision(2)} mm a tooth; usual is ${CHIP_LOAD.least} to ${CHIP_LOAD.most}.`;
    findings.push(makeFinding('chip-load', message, about));
  }
  return findings;
}
