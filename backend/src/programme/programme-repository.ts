import type { Standing } from '#shared/programme/board-schema';
import type { Database } from '../platform/database/database';
import { WorkshopRows } from '../platform/database/workshop-rows';
import { programmeTable, type ProgrammeRow } from './programme-model';

/** A programme whose work is promised: its job is accepted, or its slot is held for an issue that was sent. */
export interface PromisedRow {
  readonly id: string;
  readonly jobId: string;
  readonly standing: Standing;
  readonly holdUntil: string | null;
  readonly kept: Buffer;
  /** The approvals that were given (GivenApproval), as JSON. */
  readonly approvals: string;
}

/** An accepted estimate that has no plan. */
export interface UnplannedRow {
  readonly jobId: string;
  readonly estimateId: string;
}

/**
 * Accepted: its newest decided issue is, and the job is not put away. Held: sent, neither declined nor replaced since, and the day has not passed;
 * so a hold ends by itself.
 */
const promisedSql = `
  SELECT p.id AS id, e.job_id AS jobId, p.kept AS kept, p.hold_until AS holdUntil,
    CAST(JSON_EXTRACT(p.inputs, '$.approvals') AS CHAR) AS approvals,
    IF(EXISTS (SELECT 1 FROM issues i WHERE i.workshop_id = p.workshop_id AND i.estimate_id = p.id AND i.state = 'accepted'),
      'accepted', 'held') AS standing
  FROM programmes p
  JOIN estimates e ON e.workshop_id = p.workshop_id AND e.id = p.id
  JOIN jobs j ON j.workshop_id = e.workshop_id AND j.id = e.job_id
  LEFT JOIN issues h ON h.workshop_id = p.workshop_id AND h.id = p.hold_issue_id
  WHERE p.workshop_id = :workshopId AND p.kept IS NOT NULL AND j.state <> 'finished' AND p.id <> :except
    AND (EXISTS (SELECT 1 FROM issues i WHERE i.workshop_id = p.workshop_id AND i.estimate_id = p.id AND i.state = 'accepted')
      OR (p.hold_until >= :today AND h.state = 'sent'))
  ORDER BY p.id`;

/** Estimates of jobs that are not put away, with an accepted issue and without a plan. */
const unplannedSql = `
  SELECT e.id AS estimateId, e.job_id AS jobId
  FROM estimates e
  JOIN jobs j ON j.workshop_id = e.workshop_id AND j.id = e.job_id
  LEFT JOIN programmes p ON p.workshop_id = e.workshop_id AND p.id = e.id
  WHERE e.workshop_id = :workshopId AND p.kept IS NULL AND j.state <> 'finished'
    AND EXISTS (SELECT 1 FROM issues i WHERE i.workshop_id = e.workshop_id AND i.estimate_id = e.id AND i.state = 'accepted')
  ORDER BY e.id`;

/** Programmes of estimates. */
export class ProgrammeRepository extends WorkshopRows<ProgrammeRow> {
  constructor(private readonly database: Database) {
    super(programmeTable(database));
  }

  /** What is promised on a day, without one estimate where it is being planned itself. */
  promised(workshopId: string, today: string, except = ''): Promise<PromisedRow[]> {
    return this.database.select<PromisedRow>(promisedSql, { workshopId, today, except });
  }

  /** What was accepted and is not planned yet. */
  unplanned(workshopId: string): Promise<UnplannedRow[]> {
    return this.database.select<UnplannedRow>(unplannedSql, { workshopId });
  }
}
