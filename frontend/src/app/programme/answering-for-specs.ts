import type { Provider } from '@angular/core';
import type { Endpoint } from '#shared/actor/endpoint';
import { problemSchema } from '#shared/problems/problem-schema';
import { Api } from '../core/api/api';
import { ProblemError } from '../core/problems/problem-error';

/** What a call brought: the parts of its request, whatever they are. */
export interface AskedParts {
  readonly params?: Readonly<Record<string, string>>;
  readonly query?: Readonly<Record<string, unknown>>;
  readonly body?: unknown;
  readonly version?: number;
}

type Answer = (parts: AskedParts) => unknown;

/** A server that answers each endpoint by its name, and notes what it was asked; what it has no answer to is an error. */
export class AnsweringForSpecs {
  readonly asked: { readonly name: string; readonly parts: AskedParts }[] = [];
  readonly provider: Provider = { provide: Api, useValue: { call: this.call.bind(this) } };

  constructor(private readonly answers: Readonly<Record<string, Answer | undefined>>) {}

  of(name: string): AskedParts[] {
    return this.asked.filter((one) => one.name === name).map(({ parts }) => parts);
  }

  private async call({ name }: Endpoint, parts: AskedParts): Promise<unknown> {
    this.asked.push({ name, parts });
    await Promise.resolve();
    const answer = this.answers[name];
    if (!answer) throw new Error(`nothing answers ${name}`);
    return answer(parts);
  }
}

/** A refusal of the server. */
export const refusal = (status: number, title: string, more: object = {}): ProblemError =>
  new ProblemError(
    problemSchema.parse({ type: 'urn:problem:test', title, status, instance: 'test', errors: [], ...more }),
  );

/** The text of an element as it is read: every white space is one. */
export const spoken = (node: Element | null | undefined): string =>
  (node?.textContent ?? '').replace(/\s+/g, ' ').trim();

/** The first button that reads so. */
export function buttonIn(element: Element, text: string): HTMLButtonElement {
  const found = [...element.querySelectorAll('button')].find((one) => spoken(one) === text);
  if (!found) throw new Error(`there is no button “${text}” in: ${spoken(element)}`);
  return found;
}
