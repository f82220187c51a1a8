// Runs before the first paint, so that a page opened in the dark theme never flashes light. The application keeps the
// choice under the same key (src/lib/theme/theme.ts).
(function () {
  var choice;
  try {
    choice = localStorage.getItem('tipward-theme');
  } catch {
    choice = null;
  }
  var dark = choice === 'dark' || (choice !== 'light' && matchMedia('(prefers-color-scheme: dark)').matches);
  document.documentElement.dataset.theme = dark ? 'dark' : 'light';
})();
