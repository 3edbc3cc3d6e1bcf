// Before the first paint: the scheme that was chosen on this device (see src/hooks/useScheme.ts).
try {
  var scheme = localStorage.getItem('scrim-scheme')
  if (scheme === 'light' || scheme === 'dusk') document.documentElement.dataset.scheme = scheme
} catch (error) {
  void error
}
