export interface BrowserSettings {
  databaseUrl: string;
  apiPort: string;
  /** The address the browser opens; the API serves the built application there. */
  publicUrl: string;
  resultsDir: string;
  demoPassword: string;
  /** The page that shows the mail the application sends. */
  mailSinkUrl: string;
  /** File with the cookies of the demo player, signed in. */
  playerState: string;
}

/**
 * What `./docker-free-dev.sh test` hands to the browser's tests.
 *
 * @throws {Error} they were started by something else
 */
export function browserSettings(): BrowserSettings {
  const setting = (name: string): string => {
    const value = process.env[name];
    if (!value) {
      throw new Error(
        `${name} is not set: start these tests with ./docker-free-dev.sh test npm run test:browser.`,
      );
    }
    return value;
  };
  const resultsDir = setting('TEST_RESULTS_DIR');
  const apiPort = setting('BROWSER_API_PORT');
  return {
    databaseUrl: setting('BROWSER_DATABASE_URL'),
    apiPort,
    publicUrl: `http://127.0.0.1:${apiPort}`,
    resultsDir,
    demoPassword: setting('DEMO_PASSWORD'),
    mailSinkUrl: setting('MAIL_SINK_URL'),
    playerState: `${resultsDir}/player.json`,
  };
}
