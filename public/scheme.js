// Before anything is painted: the look the person chose, if they chose one.
try {
  var chosen = localStorage.getItem('tankmark.scheme');
  if (chosen === 'light' || chosen === 'dark') document.documentElement.dataset.scheme = chosen;
} catch {
  // Storage is closed to us: the system's look it is.
}
