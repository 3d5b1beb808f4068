/** A bar on the terminal. */

/** Draws the share done, 0 to 1. */
export type Progress = (share: number) => void;

/** A bar with a title, redrawn in place at most every per cent; elsewhere than on a terminal only its end is written. */
export function progressBar(title: string): Progress {
  let last = -1;
  return (share) => {
    const percent = Math.floor(100 * Math.min(1, share));
    if (percent === last || (!process.stderr.isTTY && percent < 100)) return;
    last = percent;
    const bar = "█".repeat(percent >> 2).padEnd(25, "░");
    process.stderr.write(`\r${title} ${bar} ${percent} %${percent === 100 ? "\n" : ""}`);
  };
}
