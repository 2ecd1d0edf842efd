/** Milliseconds between looks. */
const PATIENCE = 500;

/**
 * Stops this process when the npm that started it is gone. npm hands a signal to the
 * shell between us, which ends without handing it on: without this, stopping
 * `npm start` would leave the hub running and its port taken.
 */
export function followNpm() {
  if (!process.env.npm_lifecycle_event) return;
  const parent = process.ppid;
  const look = () => {
    if (process.ppid === parent) return;
    clearInterval(timer);
    process.kill(process.pid, 'SIGTERM');
  };
  const timer = setInterval(look, PATIENCE);
  timer.unref();
}
