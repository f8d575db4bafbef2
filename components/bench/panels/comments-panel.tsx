'use client';

import { useId, useState, type FormEvent } from 'react';
import { Button } from '@/components/ui/button';
import { Checkbox } from '@/components/ui/checkbox';
import { TextArea } from '@/components/ui/field';
import { LoadingState, ErrorState } from '@/components/ui/states';
import { Tag } from '@/components/ui/tag';
import { sentenceOf } from '@/lib/client/api-error';
import {
  useChangeComment,
  useComments,
  useCreateComment,
  useDeleteComment,
  useReply,
} from '@/lib/client/use-comments';
import type { CommentPin, CommentReply, CommentThread } from '@/lib/contracts/comment';
import { CUT_NAMES } from '@/lib/editor/edits/new-cut';
import { seenJob } from '@/lib/editor/editor-store';
import { formatLength } from '@/lib/job/format-length';
import type { Job } from '@/lib/job/job-schema';
import { classNames } from '@/components/ui/class-names';
import { useBench, useEditorState } from '../bench-context';
import { useCommentFocus } from '../comment-focus';

/** Threads pinned to spots and cuts: say, answer, resolve. A spot is chosen on the plan with the comment tool. */
export function CommentsPanel() {
  const { project, editor } = useBench();
  const { pin, setPin } = useCommentFocus();
  const comments = useComments(project.id);
  const [withResolved, setWithResolved] = useState(false);
  if (comments.isPending) return <LoadingState title="Fetching the comments" />;
  if (comments.isError)
    return (
      <ErrorState title="The comments did not come" onRetry={() => void comments.refetch()}>
        {sentenceOf(comments.error)}
      </ErrorState>
    );
  const threads = comments.data.items;
  const shown = threads.filter(({ resolvedAt }) => withResolved || resolvedAt === null);
  const resolved = threads.length - threads.filter(({ resolvedAt }) => resolvedAt === null).length;
  return (
    <div className="grid gap-4">
      {pin ? (
        <NewComment pin={pin} onDone={() => setPin(null)} />
      ) : (
        <Button icon="comment" onClick={() => editor.look({ tool: 'comment' })}>
          Comment on a spot
        </Button>
      )}
      {shown.length === 0 ? (
        <p className="text-graphite">
          Nothing has been said yet. Choose “Comment on a spot” and press where you mean, or select a cut and
          comment on it.
        </p>
      ) : null}
      <ol className="grid gap-3">
        {shown.map((thread) => (
          <Thread key={thread.id} thread={thread} number={threads.indexOf(thread) + 1} />
        ))}
      </ol>
      {resolved > 0 ? (
        <Checkbox
          label={`Show resolved (${resolved})`}
          checked={withResolved}
          onChange={(event) => setWithResolved(event.currentTarget.checked)}
        />
      ) : null}
    </div>
  );
}

function NewComment({ pin, onDone }: { pin: CommentPin; onDone: () => void }) {
  const { project, editor } = useBench();
  const job = useEditorState(seenJob);
  const create = useCreateComment(project.id);
  const { setFocus } = useCommentFocus();
  const [text, setText] = useState('');
  const submit = (event: FormEvent): void => {
    event.preventDefault();
    create.mutate(
      { pin, text },
      {
        onSuccess(thread) {
          onDone();
          setFocus(thread.id);
          editor.look({ tool: 'select' });
        },
      },
    );
  };
  return (
    <form onSubmit={submit} className="grid gap-2 rounded border border-tab bg-select p-3">
      <TextArea
        label={`Comment on ${pinWords(pin, job)}`}
        value={text}
        autoFocus
        rows={3}
        maxLength={4000}
        onChange={(event) => setText(event.currentTarget.value)}
        {...(create.error ? { error: sentenceOf(create.error) } : {})}
      />
      <div className="flex justify-end gap-2">
        <Button size="small" onClick={onDone}>
          Leave it
        </Button>
        <Button
          size="small"
          variant="primary"
          type="submit"
          busy={create.isPending}
          disabled={text.trim() === ''}
        >
          Comment
        </Button>
      </div>
    </form>
  );
}

function Thread({ thread, number }: { thread: CommentThread; number: number }) {
  const { project } = useBench();
  const job = useEditorState(seenJob);
  const { focus, show } = useCommentFocus();
  const change = useChangeComment(project.id);
  const isResolved = thread.resolvedAt !== null;
  const headingId = useId();
  return (
    <li
      id={`comment-${thread.id}`}
      aria-labelledby={headingId}
      className={classNames(
        'grid gap-2 rounded border p-3',
        focus === thread.id ? 'border-tab' : 'border-rule',
        isResolved && 'opacity-75',
      )}
    >
      <div className="flex items-start justify-between gap-2">
        <button
          type="button"
          id={headingId}
          className="lettering text-left text-lg"
          onClick={() => show(thread)}
        >
          {number} · {pinWords(thread.pin, job)}
        </button>
        {isResolved ? <Tag tone="ok">resolved</Tag> : null}
      </div>
      <Said reply={thread} />
      {thread.replies.map((reply) => (
        <div key={reply.id} className="border-l-2 border-rule pl-3">
          <Said reply={reply} />
        </div>
      ))}
      <ReplyForm commentId={thread.id} />
      <div className="flex flex-wrap gap-2">
        <Button
          size="small"
          icon={isResolved ? 'undo' : 'check'}
          busy={change.isPending}
          onClick={() => change.mutate({ commentId: thread.id, change: { resolved: !isResolved } })}
        >
          {isResolved ? 'Reopen' : 'Resolve'}
        </Button>
        <CopyLink commentId={thread.id} />
      </div>
      {change.error ? <p className="text-error">{sentenceOf(change.error)}</p> : null}
    </li>
  );
}

function Said({ reply }: { reply: CommentReply }) {
  const { project } = useBench();
  const remove = useDeleteComment(project.id);
  return (
    <div>
      <p className="text-sm text-graphite">
        <strong className="font-medium text-ink">{reply.author.name}</strong> ·{' '}
        <time dateTime={reply.createdAt}>{shortMoment(reply.createdAt)}</time>
        {reply.editedAt ? ' · edited' : ''}
        {reply.mine ? (
          <button type="button" className="pl-2 underline" onClick={() => remove.mutate(reply.id)}>
            delete
          </button>
        ) : null}
      </p>
      <p className="break-words whitespace-pre-wrap">{reply.text}</p>
      {remove.error ? <p className="text-error">{sentenceOf(remove.error)}</p> : null}
    </div>
  );
}

function ReplyForm({ commentId }: { commentId: string }) {
  const { project } = useBench();
  const reply = useReply(project.id);
  const [text, setText] = useState('');
  const submit = (event: FormEvent): void => {
    event.preventDefault();
    reply.mutate({ commentId, text }, { onSuccess: () => setText('') });
  };
  return (
    <form onSubmit={submit} className="grid gap-1">
      <TextArea
        label="Answer"
        hideLabel
        placeholder="Answer…"
        rows={text === '' ? 1 : 3}
        value={text}
        maxLength={4000}
        onChange={(event) => setText(event.currentTarget.value)}
        {...(reply.error ? { error: sentenceOf(reply.error) } : {})}
      />
      {text.trim() === '' ? null : (
        <Button size="small" variant="primary" type="submit" busy={reply.isPending}>
          Answer
        </Button>
      )}
    </form>
  );
}

function CopyLink({ commentId }: { commentId: string }) {
  const { say } = useBench();
  const copy = async (): Promise<void> => {
    const link = new URL(window.location.href);
    link.search = `?comment=${commentId}`;
    link.hash = '';
    try {
      await navigator.clipboard.writeText(link.toString());
      say('The link is copied.');
    } catch {
      say(`The link: ${link.toString()}`);
    }
  };
  return (
    <Button size="small" icon="share" onClick={() => void copy()}>
      Copy link
    </Button>
  );
}

/** Where a comment is pinned, in words. */
export function pinWords(pin: CommentPin, job: Job): string {
  if (pin.kind === 'spot') {
    const [x, y] = [pin.x, pin.y].map((value) => formatLength(Number(value.toFixed(1)), job.display));
    return `face ${pin.face} at ${x}, ${y}`;
  }
  const cut = job.cuts.find(({ id }) => id === pin.cut);
  return cut ? `‘${cut.name || CUT_NAMES[cut.kind]}’` : 'a cut that is gone';
}

function shortMoment(iso: string): string {
  return new Date(iso).toLocaleString(undefined, { dateStyle: 'medium', timeStyle: 'short' });
}
