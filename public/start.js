// What has to happen before the application's script is here.
(function () {
  function kept(name) {
    try { return localStorage.getItem('proofcloth.' + name) } catch { return null /* storage may be shut */ }
  }
  // Night or day before the first paint, so that the page does not flash; the theme store takes over from here.
  var chosen = kept('theme')
  var dark = chosen === 'dark' || (chosen !== 'light' && matchMedia('(prefers-color-scheme: dark)').matches)
  document.documentElement.dataset.theme = dark ? 'dark' : 'light'
  // Whoever was signed in here last time very likely still is: ask while the script is on its way.
  if (kept('was-in') === 'true') {
    var ahead = document.createElement('link')
    ahead.rel = 'preload'
    ahead.as = 'fetch'
    ahead.crossOrigin = 'anonymous'
    ahead.href = '/api/me'
    document.head.append(ahead)
  }
  // zod makes faster checks out of text where it may; our policy forbids that, and each try would be reported as a violation.
  globalThis.__zod_globalConfig = { jitless: true }
})()
