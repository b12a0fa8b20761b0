// Sets night or day before the first paint, so that the page does not flash; the theme store takes over from here.
(function () {
  var chosen = null
  try { chosen = localStorage.getItem('proofcloth.theme') } catch { /* storage may be shut; the system's wish then holds */ }
  var dark = chosen === 'dark' || (chosen !== 'light' && matchMedia('(prefers-color-scheme: dark)').matches)
  document.documentElement.dataset.theme = dark ? 'dark' : 'light'
})()
