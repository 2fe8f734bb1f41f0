// A person's own choice of theme, before the first paint. Runs apart from the program and must stay this small.
try {
  const choice = localStorage.getItem('wedgeline.theme')
  if (choice === 'light' || choice === 'dark' || choice === 'outdoor') document.documentElement.dataset.theme = choice
} catch {
  // Storage is refused: the system's setting holds.
}
