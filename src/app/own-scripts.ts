/** As much of the Trusted Types API as is used here: TypeScript's own types do not have it yet. */
interface TrustedTypes {
  createPolicy(name: 'default', rules: { createScriptURL: (url: string) => string }): unknown;
}

/**
 * Lets workers of this origin start where the page's policy asks for trusted script addresses. A worker's address is
 * written by the build as a plain one; whatever is no file of ours stays refused, and so is all other injected script.
 *
 * @see W3C Trusted Types, 2.3.4: the default policy
 */
export function trustOwnScripts(): void {
  const trustedTypes: unknown = Reflect.get(globalThis, 'trustedTypes');
  if (!areTrustedTypes(trustedTypes)) return;
  trustedTypes.createPolicy('default', {
    createScriptURL: url => {
      if (new URL(url, location.href).origin === location.origin) return url;
      throw new TypeError(`${url} is no script of this site.`);
    },
  });
}

function areTrustedTypes(value: unknown): value is TrustedTypes {
  return typeof value === 'object' && value !== null && 'createPolicy' in value;
}
