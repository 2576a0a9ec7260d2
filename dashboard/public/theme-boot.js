(function (page) {
  var choice = null;
  try {
    choice = page.localStorage.getItem('ampkeep.theme');
  } catch {
    // Storage may be closed to us; then the system's setting decides.
  }
  var isSystemDark = page.matchMedia('(prefers-color-scheme: dark)').matches;
  var isNight = choice === 'night' || (choice !== 'day' && isSystemDark);
  page.document.documentElement.dataset.theme = isNight ? 'night' : 'day';
})(globalThis);
