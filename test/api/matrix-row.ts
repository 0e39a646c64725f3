import type { WordCode } from '#shared/words/word-code';
import type { Api, TestPerson, TestWorkshop } from './start-api';
import type { Parts, Visitor } from './visitor';

/** What the matrix must know of one endpoint to call it: a new endpoint without its row fails. */
export interface MatrixRow {
  /**
   * Makes what the call needs in a workshop and answers a valid call; texts begin with the workshop's mark. `caller` is who will
   * call, where the endpoint needs a person of the workshop.
   */
  readonly prepare: (workshop: TestWorkshop, api: Api, caller: TestPerson) => Parts | Promise<Parts>;
  /** The history a successful call leaves; `none` for calls that change nothing of a workshop. */
  readonly history?: WordCode;
  /** How many entries of history it leaves, where it is not one. */
  readonly entries?: number;
  /** The status of a valid call, where it is neither 200 nor 204. */
  readonly status?: number;
  /** The call changes who the caller is, so somebody new makes it. */
  readonly bySomebodyNew?: true;
  /** What is asked for is the caller’s own, so it is made ready for each of them. */
  readonly ofTheCaller?: true;
  /** The body names rows of the workshop, so that another workshop's must be refused as not found. Known for what stands in the path. */
  readonly namesRows?: true;
}

/** The client a call is made by, where the endpoint is for one. */
export interface ClientCall {
  readonly visitor: Visitor;
  readonly parts: Parts;
}

/** What the matrix must know of an endpoint for clients: how one of a workshop comes to call it. */
export interface ClientRow extends Omit<MatrixRow, 'prepare' | 'bySomebodyNew'> {
  /** A client on a visit, and a valid call of theirs. */
  readonly visit: (workshop: TestWorkshop, api: Api) => Promise<ClientCall>;
}

/** The rows of one feature, by the names of its endpoints. */
export type MatrixRows = Readonly<Record<string, MatrixRow>>;
export type ClientRows = Readonly<Record<string, ClientRow>>;
