// Runs before the first paint, so that a dark device never flashes light. The keys are those of src/app/theme/scheme.ts.
(function () {
  var dark = window.matchMedia('(prefers-color-scheme: dark)').matches;
  var chosen = null;
  try {
    chosen = window.localStorage.getItem('ferrite-theme');
  } catch {
    // Storage may be shut off; then the device decides.
  }
  if (chosen === 'light' || chosen === 'dark') dark = chosen === 'dark';
  document.documentElement.setAttribute('data-theme', dark ? 'dark' : 'light');
})();
