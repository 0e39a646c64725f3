/** A client who reads their own papers: by the link to one job, or signed in by a mailed link to all of theirs (`jobId` null). */
export interface ClientActor {
  readonly accessId: string;
  readonly workshopId: string;
  readonly clientId: string;
  readonly jobId: string | null;
  readonly name: string;
  readonly email: string;
}
