'use client';

import { useEffect, useRef, useState } from 'react';
import type { Finding, SourceText } from '@/compiler';
import type { BuiltRig, CompileAnswer, CompileQuestion, TrialShown } from './messages';

/** What the compiler last said of the text. */
export interface CompilerState {
  readonly findings: readonly Finding[];
  /** The last rig that could be built; it stays while the text has errors. */
  readonly built: BuiltRig | null;
  /** True while `built` belongs to an earlier text, because the present one has errors. */
  readonly isBuiltOlder: boolean;
  /** What the trials of the present text measured; empty while it has other errors. */
  readonly trials: readonly TrialShown[];
  /** Sequence of the newest answer; 0 before the first. */
  readonly sequence: number;
  /** Milliseconds the worker took for it. */
  readonly took: number;
}

const NOTHING: CompilerState = {
  findings: [],
  built: null,
  isBuiltOlder: false,
  trials: [],
  sequence: 0,
  took: 0,
};

/**
 * Keeps a compiler running beside the page and asks it anew whenever the text changes, at most once a frame. Stale
 * answers are never shown.
 */
export function useCompiler(
  text: string,
  name: string,
  bases: Readonly<Record<string, SourceText>>,
): CompilerState {
  const [state, setState] = useState(NOTHING);
  const worker = useRef<Worker | null>(null);
  const asked = useRef(0);

  useEffect(() => {
    const started = new Worker(new URL('./compiler.worker.ts', import.meta.url), { type: 'module' });
    started.addEventListener('message', (event: MessageEvent<CompileAnswer>) => {
      const { sequence, findings, built, trials, took } = event.data;
      if (sequence < asked.current) return;
      setState((before) => ({
        findings,
        built: built ?? before.built,
        isBuiltOlder: built === null && before.built !== null,
        trials,
        sequence,
        took,
      }));
    });
    worker.current = started;
    return () => {
      started.terminate();
      worker.current = null;
    };
  }, []);

  useEffect(() => {
    const frame = requestAnimationFrame(() => {
      asked.current += 1;
      const question: CompileQuestion = { sequence: asked.current, text, name, bases };
      worker.current?.postMessage(question);
    });
    return () => cancelAnimationFrame(frame);
  }, [text, name, bases]);

  return state;
}
