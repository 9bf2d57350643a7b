/** A browser whose storage does not answer in this time counts as one that keeps nothing. */
const PATIENCE_MS = 2000;

/** What storage answers. While a sign-out clears it, some questions to it are never answered. @throws Error too late */
export const inTime = <Result>(work: Promise<Result>): Promise<Result> =>
  Promise.race([
    work,
    new Promise<never>((_, reject) => {
      setTimeout(() => reject(new Error('The browser does not answer.')), PATIENCE_MS);
    }),
  ]);
