// Runs before the page is painted: a theme chosen earlier shows from the start, without a flash of the other.
try {
  const theme = localStorage.getItem('sealwright-theme');
  if (theme === 'light' || theme === 'dark') document.documentElement.dataset.theme = theme;
} catch {
  // A page that may not store follows the device.
}
