import type { Job } from '@/lib/job/job-schema';
import type { ResolvedOutlines } from '@/lib/outline/resolve-outlines';
import { makeFinding } from '@/lib/report/make-finding';
import type { Finding } from '@/lib/report/report';

/** Characters of texts in use that their font has not, one finding for each cut and outline. */
export function findMissingGlyphs(job: Job, outlines: ResolvedOutlines): Finding[] {
  return job.cuts
    .filter(({ enabled }) => enabled)
    .flatMap((cut) =>
      cut.outlines.flatMap((id) => {
        const outline = outlines.get(id, cut.face);
        if (outline.missingGlyphs.length === 0) return [];
        const characters = outline.missingGlyphs.map((glyph) => `“${glyph}”`).join(', ');
        const message = `'${outline.name}': the font has no ${characters}; nothing is cut there.`;
        return [makeFinding('text-missing-glyph', message, { cut: cut.id, face: cut.face })];
      }),
    );
}
