/** Median time of one call, in microseconds: warmed up, then measured in batches of about five milliseconds. */
export const microseconds = async (work: () => unknown, batches = 60): Promise<number> => {
  const warmUntil = performance.now() + 200;
  let calls = 0;
  while (performance.now() < warmUntil) {
    await work();
    calls += 1;
  }
  const perBatch = Math.max(1, Math.round((calls / 200) * 5));
  const times: number[] = [];
  for (let batch = 0; batch < batches; batch += 1) {
    const begun = performance.now();
    for (let call = 0; call < perBatch; call += 1) await work();
    times.push(((performance.now() - begun) / perBatch) * 1000);
  }
  times.sort((a, b) => a - b);
  return times[Math.floor(times.length / 2)] ?? 0;
};

/** The same for work that does not wait: awaiting costs as much as a small rule. */
export const microsecondsSync = (work: () => unknown, batches = 60): number => {
  const warmUntil = performance.now() + 300;
  let calls = 0;
  while (performance.now() < warmUntil) {
    work();
    calls += 1;
  }
  const perBatch = Math.max(1, Math.round((calls / 300) * 5));
  const times: number[] = [];
  for (let batch = 0; batch < batches; batch += 1) {
    const begun = performance.now();
    for (let call = 0; call < perBatch; call += 1) work();
    times.push(((performance.now() - begun) / perBatch) * 1000);
  }
  times.sort((a, b) => a - b);
  return times[Math.floor(times.length / 2)] ?? 0;
};

export const show = (us: number): string =>
  us >= 1000 ? `${(us / 1000).toFixed(2)} ms` : `${us.toFixed(1)} µs`;

export const table = (title: string, rows: readonly (readonly [string, string, string])[]): void => {
  console.log(`\n### ${title}\n\n| what | figure | beside it |\n|---|---|---|`);
  for (const cells of rows) console.log(`| ${cells.join(' | ')} |`);
};
