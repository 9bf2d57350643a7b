// Runs before anything of the app. The content policy forbids compiled code, so the schema library is told
// not to probe for it; and the reader's colours are there before the first paint.
globalThis.__zod_globalConfig = { jitless: true };
try {
  const theme = localStorage.getItem('plait.theme');
  if (theme === 'light' || theme === 'dark') document.documentElement.dataset.theme = theme;
} catch {
  // Storage may be off: the device's own setting then decides.
}
