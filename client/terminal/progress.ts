/** How far a run over many notes is, and how long it still takes. */

/** Gives the words for a number of notes done: "1,200 of 10,000 notes, about 40 s left". */
export function timeLeft(total: number): (done: number) => string {
  const started = performance.now();
  const figure = (count: number): string => count.toLocaleString("en");
  return (done) => {
    const seconds = (performance.now() - started) / 1000;
    const left = done > 0 && seconds > 1 ? Math.round((seconds / done) * (total - done)) : undefined;
    const said =
      left === undefined ? "" : left < 100 ? `, about ${left} s left` : `, about ${Math.round(left / 60)} min left`;
    return `${figure(done)} of ${figure(total)} notes${said}`;
  };
}
