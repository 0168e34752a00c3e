const everyMilliseconds = 100;
const bytesPerMegabyte = 1e6;

/** Watches the memory of this process, all threads together; the answer ends it and gives the peak in MB. */
export function watchMemory(): () => number {
  let peak = process.memoryUsage.rss();
  const look = () => {
    peak = Math.max(peak, process.memoryUsage.rss());
  };
  const timer = setInterval(look, everyMilliseconds);
  return () => {
    clearInterval(timer);
    look();
    return Math.round(peak / bytesPerMegabyte);
  };
}
