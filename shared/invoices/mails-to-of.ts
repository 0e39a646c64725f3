interface Reached {
  readonly email: string;
}

/** Where letters about an invoice go: the address that stands on it, else the one kept of the client by now; empty where neither is known. */
export const mailsToOf = (buyer: Reached, client: Reached): string => (buyer.email === '' ? client.email : buyer.email);
