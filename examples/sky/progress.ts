/** A line on the terminal that says how far a long job is. */

/** Rewrites the line; on anything but a terminal it stays silent until the end. */
export function progress(done: number, all: number, what: string): void {
  if (process.stderr.isTTY)
    process.stderr.write(`\r${done} of ${all} ${what}${done === all ? "\n" : ""}`);
  else if (done === all) process.stderr.write(`${all} ${what} done\n`);
}
