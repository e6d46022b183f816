// Runs before the first paint, so that a dark cab never sees a white flash. The choice is kept in this browser only.
(function () {
  var key = 'rowrise-theme';
  var night = window.matchMedia('(prefers-color-scheme: dark)');

  function apply() {
    var choice = 'light';
    try {
      choice = window.localStorage.getItem(key) || 'light';
    } catch {
      // Storage can be shut off; the light theme stands then.
    }
    var dark = choice === 'dark' || (choice === 'auto' && night.matches);
    document.documentElement.setAttribute('data-theme', dark ? 'dark' : 'light');
  }

  apply();
  night.addEventListener('change', apply);
  // The storage event tells the other tabs; the theme choice on this page sends the second one itself.
  window.addEventListener('storage', apply);
  window.addEventListener('rowrise-theme', apply);
})();
