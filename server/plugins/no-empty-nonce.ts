import { getResponseHeader, setResponseHeader } from 'h3'

const EMPTY = / 'nonce-\{\{nonce\}\}'/g

/** A redirect of a page is answered before its nonce is put in: a policy must not name a nonce that everybody knows. */
export default defineNitroPlugin((nitro) => {
  nitro.hooks.hook('beforeResponse', (event) => {
    const policy = getResponseHeader(event, 'content-security-policy')
    if (typeof policy === 'string' && policy.includes('{{nonce}}')) setResponseHeader(event, 'content-security-policy', policy.replace(EMPTY, ''))
  })
})
