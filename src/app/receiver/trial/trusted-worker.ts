/** The part of Trusted Types used here; browsers without it take addresses as they are. */
interface TrustedTypes {
  createPolicy(
    name: string,
    rules: { createScriptURL(address: string): string },
  ): { createScriptURL(address: string): string };
}

const { trustedTypes } = globalThis as { trustedTypes?: TrustedTypes };

/** Lets through what this server serves, and nothing else. */
const policy = trustedTypes?.createPolicy('fallow#worker', {
  createScriptURL: (address) => {
    if (new URL(address).origin !== location.origin) throw new TypeError(`Not ours: ${address}`);
    return address;
  },
});

/** A worker that the page's Trusted Types let start. */
export class TrustedWorker extends Worker {
  constructor(address: URL, options?: WorkerOptions) {
    super(policy?.createScriptURL(address.href) ?? address, options);
  }
}
