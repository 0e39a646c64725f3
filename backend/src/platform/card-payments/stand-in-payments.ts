import { randomBytes, randomUUID } from 'node:crypto';
import { createServer, type IncomingMessage, type Server, type ServerResponse } from 'node:http';
import type { AddressInfo } from 'node:net';
import Stripe from 'stripe';
import { payOrLeave } from './pay-or-leave';
import {
  fieldsOf,
  StandInLedger,
  type StandInDispute,
  type StandInRefund,
  type StandInSession,
} from './stand-in-ledger';

/** What the stand-in needs: how its events reach the server, and what time it is. */
export interface StandInSettings {
  readonly deliver: (signed: { bytes: Buffer; signature: string }) => Promise<void>;
  readonly now: () => Date;
}

async function bodyOf(request: IncomingMessage): Promise<string> {
  const parts: Buffer[] = [];
  for await (const part of request) parts.push(part as Buffer);
  return Buffer.concat(parts).toString('utf8');
}

interface Asked {
  readonly method: string;
  readonly path: string;
  readonly fields: Readonly<Record<string, string>>;
  readonly key: string | undefined;
}

/**
 * Stands in for the payment service on loopback where no live key is set: it speaks the same HTTP for checkout sessions and refunds,
 * signs its events the same way, and takes no money. What it knows is gone when it stops.
 */
export class StandInPayments {
  readonly secretKey = `sk_test_${randomBytes(12).toString('hex')}`;
  readonly webhookSecret = `whsec_${randomBytes(24).toString('hex')}`;
  readonly ledger = new StandInLedger();
  private readonly signer = new Stripe(this.secretKey);
  private readonly answered = new Map<string, unknown>();
  private readonly telling = new Set<Promise<void>>();
  private readonly server: Server = createServer((request, response) => void this.serve(request, response));

  constructor(private readonly settings: StandInSettings) {}

  /** Starts and answers where it is. */
  async start(port = 0): Promise<{ host: string; port: number }> {
    await new Promise<void>((resolve, reject) => {
      this.server.once('error', reject).listen(port, '127.0.0.1', () => resolve());
    });
    return { host: '127.0.0.1', port: this.port };
  }

  async stop(): Promise<void> {
    const closed = new Promise<void>((resolve) => this.server.close(() => resolve()));
    this.server.closeAllConnections();
    await closed;
    await this.quiet();
  }

  /** Waits until every event that was begun has arrived or is lost. */
  async quiet(): Promise<void> {
    await Promise.all(this.telling);
  }

  /** Pays a session as its payer would; the event may be held back, to be sent later, again, or never. */
  async pay(sessionId: string, isTold = true): Promise<StandInSession> {
    const session = this.ledger.pay(sessionId);
    if (isTold) await this.tell('checkout.session.completed', session);
    return session;
  }

  /** A bank takes a payment back; it is told of twice, as the service does. */
  async dispute(intentId: string, more: Partial<StandInDispute> = {}): Promise<StandInDispute> {
    const dispute = this.ledger.dispute(intentId, more);
    await this.tell('charge.dispute.created', dispute);
    await this.tell('charge.dispute.funds_withdrawn', dispute);
    return dispute;
  }

  async closeDispute(id: string, status: 'won' | 'lost'): Promise<StandInDispute> {
    const dispute = this.ledger.changeDispute(id, status);
    await this.tell('charge.dispute.closed', dispute);
    return dispute;
  }

  /** A refund did not reach its payer. */
  async failRefund(id: string): Promise<StandInRefund> {
    const refund = this.ledger.changeRefund(id, 'failed');
    await this.tell('refund.failed', refund);
    await this.tell('charge.refund.updated', refund);
    return refund;
  }

  /** An event as it is sent, signed. */
  signed(kind: string, object: object, id = `evt_${randomUUID()}`): { bytes: Buffer; signature: string } {
    const seconds = Math.floor(this.settings.now().getTime() / 1_000);
    const payload = JSON.stringify({ id, object: 'event', type: kind, created: seconds, data: { object } });
    const signing = { payload, secret: this.webhookSecret, timestamp: seconds };
    return { bytes: Buffer.from(payload), signature: this.signer.webhooks.generateTestHeaderString(signing) };
  }

  private get port(): number {
    return (this.server.address() as AddressInfo).port;
  }

  /** An event that does not arrive is lost: whoever waits for it has to ask. */
  private async tell(kind: string, object: object): Promise<void> {
    await this.settings.deliver(this.signed(kind, object)).catch(() => undefined);
  }

  private async serve(request: IncomingMessage, response: ServerResponse): Promise<void> {
    const url = new URL(request.url ?? '/', 'http://127.0.0.1');
    const fields = { ...Object.fromEntries(url.searchParams), ...fieldsOf(await bodyOf(request)) };
    const key = request.headers['idempotency-key'];
    const asked = {
      method: request.method ?? 'GET',
      path: url.pathname,
      fields,
      key: typeof key === 'string' ? key : undefined,
    };
    if (asked.path.startsWith('/pay/')) return this.servePage(asked, response);
    const isKnown = request.headers.authorization === `Bearer ${this.secretKey}`;
    const [status, answer] = isKnown
      ? this.answer(asked)
      : [401, { error: { type: 'authentication_error', message: 'no such key' } }];
    response.writeHead(status, { 'content-type': 'application/json' }).end(JSON.stringify(answer));
  }

  private answer(asked: Asked): readonly [number, unknown] {
    try {
      const before = asked.key === undefined ? undefined : this.answered.get(asked.key);
      const answer = before ?? this.done(asked);
      if (asked.key !== undefined) this.answered.set(asked.key, answer);
      return answer === undefined
        ? [404, { error: { type: 'invalid_request_error', message: 'not here' } }]
        : [200, answer];
    } catch (error) {
      return [400, { error: { type: 'invalid_request_error', message: (error as Error).message } }];
    }
  }

  private done({ method, path, fields }: Asked): unknown {
    const id = /^\/v1\/checkout\/sessions\/(cs_[\w-]+)/.exec(path)?.[1];
    if (method === 'POST' && path === '/v1/checkout/sessions')
      return this.ledger.begin(fields, `http://127.0.0.1:${this.port}`);
    if (method === 'GET' && id) return this.ledger.session(id);
    if (method === 'POST' && id && path.endsWith('/expire')) return this.ledger.expire(id);
    if (method === 'GET' && path === '/v1/refunds')
      return { object: 'list', has_more: false, data: this.ledger.refundsOf(fields['payment_intent'] ?? '') };
    if (method === 'GET' && path === '/v1/disputes')
      return { object: 'list', has_more: false, data: this.ledger.disputesOf(fields['payment_intent'] ?? '') };
    if (method !== 'POST' || path !== '/v1/refunds') return undefined;
    const refund = this.ledger.refund(fields);
    // Told beside the answer, as the service does: whoever asked may hold what the event waits for.
    this.telling.add(this.tell('refund.created', refund));
    return refund;
  }

  private async servePage({ method, path, fields }: Asked, response: ServerResponse): Promise<void> {
    const session = this.ledger.session(path.slice('/pay/'.length));
    if (!session) return void response.writeHead(404).end();
    if (method === 'POST' && session.status === 'open' && fields['answer'] === 'pay') await this.pay(session.id);
    if (method === 'POST') return void response.writeHead(303, { location: session.success_url }).end();
    response
      .writeHead(200, {
        'content-type': 'text/html; charset=utf-8',
        'content-security-policy': "default-src 'none'; style-src 'unsafe-inline'",
      })
      .end(payOrLeave(session));
  }
}
