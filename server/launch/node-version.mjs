/** The Node versions Plait is tried with, as in `engines` of package.json. */
export const OLDEST_NODE = '20.19.0';
export const FIRST_UNTRIED_MAJOR = 23;

/**
 * Says what is wrong with a Node version, or nothing when it will do.
 * Imports nothing and uses old syntax only, so that an old Node can still read it.
 * @param {string} version such as "20.19.0"
 * @returns {string | undefined} one sentence
 */
export function refuseNode(version) {
  const [major = 0, minor = 0] = version.split('.').map(Number);
  const [oldestMajor = 0, oldestMinor = 0] = OLDEST_NODE.split('.').map(Number);
  const isOld = major < oldestMajor || (major === oldestMajor && minor < oldestMinor);
  if (isOld) {
    return `Plait needs Node ${oldestMajor}.${oldestMinor} or newer and this is Node ${version}: install Node 20 or 22 from nodejs.org and run the command again.`;
  }
  if (major >= FIRST_UNTRIED_MAJOR) {
    return `Plait has not been tried with Node ${version}: install Node 20 or 22 and run the command again.`;
  }
  return undefined;
}

/** Ends the process with one sentence when this Node will not do. */
export function checkNode() {
  const refusal = refuseNode(process.versions.node);
  if (refusal) {
    process.stderr.write(`${refusal}\n`);
    process.exit(1);
  }
}
