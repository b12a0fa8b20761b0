/**
 * naive-ui puts its styles into <style> elements made by script and has no way to give them the page's nonce, so the strict content
 * security policy would leave it unstyled. Every <style> made from here on carries the nonce the server wrote into the page.
 * Imported before anything else; look at it again whenever naive-ui is upgraded.
 */
const nonce = document.querySelector<HTMLMetaElement>('meta[name="csp-nonce"]')?.content
if (nonce && !nonce.startsWith('__')) {
  const create = document.createElement.bind(document)
  document.createElement = ((name: string, options?: ElementCreationOptions) => {
    const element = create(name, options)
    if (name.toLowerCase() === 'style') element.setAttribute('nonce', nonce)
    return element
  }) as typeof document.createElement
}
export {}
