import { useEffect, useReducer, useRef } from 'react';
import type { Answers, Wish } from './picture.ts';
import { CannotCut, GivenUp, type FrameFiles, type WorkshopClient } from './workshop-client.ts';

/** How far a wish is. `answer` is the latest there is, of an earlier wish as long as a new one is worked on. */
export interface Asked<A> {
  readonly at: 'working' | 'ready' | 'stopped' | 'refused' | 'failed';
  /** Share done, from 0 to 1. */
  readonly done: number;
  readonly answer: A | null;
  /** Why it was refused or failed; '' otherwise. */
  readonly reason: string;
}

type News<A> =
  | { readonly kind: 'begin' }
  | { readonly kind: 'progress'; readonly done: number }
  | { readonly kind: 'answer'; readonly answer: A }
  | { readonly kind: 'stop' }
  | { readonly kind: 'error'; readonly error: unknown };

function follow<A>(before: Asked<A>, news: News<A>): Asked<A> {
  switch (news.kind) {
    case 'begin':
      return { at: 'working', done: 0, answer: before.answer, reason: '' };
    case 'progress':
      return before.at === 'working' ? { ...before, done: news.done } : before;
    case 'answer':
      return { at: 'ready', done: 1, answer: news.answer, reason: '' };
    case 'stop':
      return { ...before, at: 'stopped' };
    case 'error':
      return {
        at: news.error instanceof CannotCut ? 'refused' : 'failed',
        done: 0,
        answer: null,
        reason: news.error instanceof Error ? news.error.message : String(news.error),
      };
  }
}

/**
 * Asks the worker about a frame whenever the frame or the wish changes (wishes are compared by what they say); null asks
 * nothing. Progress is told at most once a frame of the screen. `stop` gives up, `again` asks anew.
 */
export function useAnswer<W extends Wish>(client: WorkshopClient, frame: FrameFiles, wish: W | null) {
  type Answer = Answers[W['kind']];
  const [asked, tell] = useReducer(follow<Answer>, { at: 'working', done: 0, answer: null, reason: '' });
  const [round, again] = useReducer((n: number) => n + 1, 0);
  const control = useRef<AbortController | null>(null);
  const said = JSON.stringify(wish);

  useEffect(() => {
    const asking = JSON.parse(said) as W | null;
    if (!asking) return;
    const mine = new AbortController();
    control.current = mine;
    tell({ kind: 'begin' });
    client
      .ask(frame, asking, (done) => tell({ kind: 'progress', done }), mine.signal)
      .then((answer) => tell({ kind: 'answer', answer }))
      .catch((error: unknown) => {
        // A wish that was given up for another one has nothing to say.
        if (!(error instanceof GivenUp)) tell({ kind: 'error', error });
      });
    return () => mine.abort();
  }, [client, frame, said, round]);

  const stop = () => {
    control.current?.abort();
    tell({ kind: 'stop' });
  };
  return { ...asked, stop, again };
}
