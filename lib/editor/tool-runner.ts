import { assertNever } from '@/lib/base/assert-never';
import type { Vec } from '@/lib/geometry/vec';
import type { Editor } from './editor-store';
import { ellipseTool, rectTool } from './tools/box-tool';
import { commentTool, pointsTool, sectionTool } from './tools/place-tools';
import { polylineTool } from './tools/polyline-tool';
import { selectTool } from './tools/select-tool';
import type { Draft, Tool, ToolContext, ToolEffect, ToolEvent, ToolId } from './tools/tool';

/** A tool whose state only itself looks into. */
interface RunningTool {
  step(event: ToolEvent, context: ToolContext): readonly ToolEffect[];
  draft(): Draft | null;
}

function run<State>(tool: Tool<State>): RunningTool {
  let state = tool.idle;
  return {
    step(event, context) {
      const next = tool.step(state, event, context);
      state = next.state;
      return next.effects;
    },
    draft: () => tool.draft(state),
  };
}

const START: Readonly<Record<ToolId, () => RunningTool>> = {
  select: () => run(selectTool),
  rect: () => run(rectTool),
  ellipse: () => run(ellipseTool),
  polyline: () => run(polylineTool),
  points: () => run(pointsTool),
  section: () => run(sectionTool),
  comment: () => run(commentTool),
};

export interface ToolRunner {
  send(event: ToolEvent): void;
  /** What the running gesture draws over the board, or null. */
  draft(): Draft | null;
}

export interface RunnerHost {
  outlinesWithin(from: Vec, to: Vec): readonly string[];
  /** A spot was chosen for a comment. */
  onComment(at: Vec): void;
  /** Called after every event: the draft may have changed. */
  onChange(): void;
  /** A reader's hand changes nothing: previews and steps are dropped. */
  readonly readOnly: boolean;
}

/** Hands events to the tool in hand and does what it asks. Changing the tool drops what was half done. */
export function createToolRunner(editor: Editor, host: RunnerHost): ToolRunner {
  let tool = editor.store.getState().session.tool;
  let running = START[tool]();

  const follow = (): void => {
    const { session } = editor.store.getState();
    if (session.tool === tool) return;
    tool = session.tool;
    running = START[tool]();
    editor.cancel();
  };
  const context = (): ToolContext => {
    const { history, session } = editor.store.getState();
    const { face, selection, section } = session;
    return {
      job: history.present,
      face,
      selection,
      section,
      outlinesWithin: (a, b) => host.outlinesWithin(a, b),
    };
  };

  return {
    send(event) {
      follow();
      for (const effect of running.step(event, context())) perform(effect, editor, host);
      follow();
      host.onChange();
    },
    draft() {
      follow();
      return running.draft();
    },
  };
}

function perform(effect: ToolEffect, editor: Editor, host: RunnerHost): void {
  switch (effect.kind) {
    case 'preview':
      if (!host.readOnly) editor.preview(effect.job);
      break;
    case 'apply':
      if (!host.readOnly) editor.apply(effect.label, effect.job);
      break;
    case 'cancel':
      editor.cancel();
      break;
    case 'select':
      editor.select(effect.selection);
      break;
    case 'section':
      editor.look({ section: effect.line });
      break;
    case 'comment':
      host.onComment(effect.at);
      break;
    case 'tool':
      editor.look({ tool: effect.tool });
      break;
    default:
      assertNever(effect, 'effect');
  }
}
