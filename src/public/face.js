// Runs before the first paint: the reader's own face, and a sign for the style sheet that scripts run here.
(function () {
  var root = document.documentElement;
  root.dataset.script = '';
  var found = /(?:^|; )face=(paper|garage)(?:;|$)/.exec(document.cookie);
  if (found) root.dataset.face = found[1];
})();
