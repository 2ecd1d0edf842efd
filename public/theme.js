// Runs before the first paint, so that the chosen theme and language show without a flash.
// A file of its own because the Content-Security-Policy allows no inline script.
(() => {
  let kept = {};
  try {
    kept = JSON.parse(localStorage.getItem('steelyard.settings') ?? '{}') ?? {};
  } catch {
    // Storage may be barred or hold something else: go on with the device's own choice.
  }
  const dark =
    kept.theme === 'dark' ||
    (kept.theme !== 'light' && matchMedia('(prefers-color-scheme: dark)').matches);
  document.documentElement.dataset.theme = dark ? 'dark' : 'light';
  if (kept.language === 'fr' || kept.language === 'en') {
    document.documentElement.lang = kept.language;
  }
})();
