import { it } from 'vitest';
import { samples, createPoser } from '@/compiler';
import { makeTrialBench } from '@/compiler/trials/TrialBench';
import { runTrials, TRIALS } from '@/compiler/trials/runTrials';
import { trialSubject } from './trialSubject';
it('x', () => {
  for (const s of samples) {
    const { rig, intent } = trialSubject(s.text);
    const time: Record<string, number> = {};
    const N = 40;
    let t = performance.now();
    for (let i=0;i<N;i++) makeTrialBench(rig, intent);
    time['bench'] = (performance.now()-t)/N;
    const b = makeTrialBench(rig, intent);
    t = performance.now();
    for (let i=0;i<N;i++) b.poser.evaluate({});
    time['evaluate'] = (performance.now()-t)/N;
    for (const [n, f] of Object.entries(TRIALS)) {
      f(b);
      t = performance.now();
      for (let i=0;i<N;i++) f(b);
      time[n] = (performance.now()-t)/N;
    }
    console.log(s.id, time);
    console.table(runTrials(rig, intent).filter(r=>!r.passed).map(({pose,worst,...r})=>({...r,worst:worst.join(' ')})));
  }
});
