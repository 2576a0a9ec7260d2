import { useEffect, useState } from 'react';
import { Loading } from '@/components/ui/loading';

const stages: [afterSeconds: number, words: string][] = [
  [0, 'The server computes every published case anew.'],
  [4, 'Still at it: straight lines, uncertainties, distributions, intervals, risks.'],
  [20, 'This takes longer than usual; the server may be busy. The table comes as soon as it is done.'],
];

/** What is going on while the server computes, and for how long. */
export function ProofProgress() {
  const seconds = useSecondsSinceShown();
  const words = stages.findLast(([after]) => seconds >= after)?.[1];
  return (
    <>
      <p role="status">{words}</p>
      <p className="figures" aria-hidden>
        {seconds} s
      </p>
      <Loading label="the proof" lines={10} />
    </>
  );
}

function useSecondsSinceShown(): number {
  const [seconds, setSeconds] = useState(0);
  useEffect(() => {
    const timer = setInterval(() => setSeconds((before) => before + 1), 1000);
    return () => clearInterval(timer);
  }, []);
  return seconds;
}
