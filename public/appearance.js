// Before anything is painted: a look that was pinned on this device holds from the first moment (hooks/use-appearance.ts keeps it).
try {
  document.documentElement.dataset.appearance = localStorage.getItem('thickset.appearance') ?? 'system';
} catch {
  // a browser that keeps nothing follows the system
}
