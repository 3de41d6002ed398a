// Runs before the first paint, so that a dark cellar never flashes white.
(function () {
  var theme = 'system';
  try {
    theme = localStorage.getItem('barmkin-theme') || theme;
  } catch (e) {
    // Storage may be shut off; the system's theme is then right.
  }
  document.documentElement.dataset.theme = theme;
})();
