/* global document, localStorage, window */
// Sets the theme before the first frame is painted: a bright flash would undo half an hour of dark adaptation.
// A file of its own, because the content policy allows no script inside the page. Kept in step with
// src/design/theme/theme.ts by a test.
(function () {
  var papers = { day: '#FAF7F0', dusk: '#17130F', 'red-night': '#000000' };
  var chosen;
  try {
    chosen = localStorage.getItem('harkmoor.theme');
  } catch {
    chosen = null; // storage is refused: the system's wish still holds
  }
  var theme = Object.prototype.hasOwnProperty.call(papers, chosen)
    ? chosen
    : window.matchMedia('(prefers-color-scheme: dark)').matches
      ? 'dusk'
      : 'day';
  var root = document.documentElement;
  root.dataset.theme = theme;
  root.style.backgroundColor = papers[theme];
  root.style.colorScheme = theme === 'day' ? 'light' : 'dark';
  var bar = document.querySelector('meta[name="theme-color"]');
  if (bar) bar.setAttribute('content', papers[theme]);
})();
