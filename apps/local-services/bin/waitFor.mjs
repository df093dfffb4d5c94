/**
 * Waits until an address answers with success: `node waitFor.mjs <url> <seconds> [<pid>]`.
 * Ends at once when the process that should answer is gone. A minimal Debian has no curl.
 */
const [url, seconds, pid] = process.argv.slice(2);
const deadlineMs = Date.now() + Number(seconds) * 1000;
const pauseMs = 150;

const answers = () =>
  fetch(url, { signal: AbortSignal.timeout(5000) }).then(
    async (response) => {
      await response.arrayBuffer();
      return response.ok;
    },
    () => false,
  );

function isAlive() {
  if (!pid) return true;
  try {
    process.kill(Number(pid), 0);
    return true;
  } catch (error) {
    return error.code === 'EPERM';
  }
}

while (!(await answers())) {
  if (!isAlive() || Date.now() > deadlineMs) process.exit(1);
  await new Promise((resolve) => setTimeout(resolve, pauseMs));
}
