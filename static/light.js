// Runs before the page is drawn, so that the night lab never flashes white.
try {
  const kept = localStorage.getItem('light');
  if (kept === 'day' || kept === 'night') document.documentElement.dataset.light = kept;
} catch {
  // Storage can be switched off; the page then follows the system.
}
