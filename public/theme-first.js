/* global document, localStorage */
// Runs before the first paint, so that a chosen theme never flashes through the system's one.
// A file of its own because the content security policy allows no inline script.
try {
  const choice = localStorage.getItem('leeward-theme');
  if (choice === 'sheet' || choice === 'dim') document.documentElement.dataset.theme = choice;
} catch {
  // Storage may be closed to the page: the system's theme is then the right one.
}
