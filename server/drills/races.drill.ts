import { afterAll, beforeAll, describe, expect, it, jest } from '@jest/globals';
import { ReleaseArchiveService } from '../src/releases/release-archive.service.js';
import { type Crew, crewOf, Group } from '../test/actors.js';
import {
  aftermathOf,
  approvedVersion,
  fitOf,
  releasedNumbers,
  releasing,
  returning,
  together,
  WON,
} from '../test/races.js';

const ROUNDS = 100;
/** Who comes after the other has finished finds another state; who comes meanwhile has lost the race. */
const LOSER = /^(CONFLICT|WRONG_STATE)$/;

describe(`releases that race, ${ROUNDS} rounds each`, () => {
  let group: Group;
  let crew: Crew;

  beforeAll(async () => {
    group = await Group.start();
    crew = await crewOf(group);
    // The printing of each release would only slow the races down.
    const archive = group.server.app.get(ReleaseArchiveService, { strict: false });
    jest.spyOn(archive, 'archivePdf').mockResolvedValue(undefined);
  });
  afterAll(() => group.stop());

  /** @returns the place of the only winner */
  function winnerOf(outcomes: string[]): number {
    expect(outcomes.filter((outcome) => outcome === WON)).toHaveLength(1);
    for (const outcome of outcomes) if (outcome !== WON) expect(outcome).toMatch(LOSER);
    return outcomes.indexOf(WON);
  }

  it('release a version once, however many release it at once', async () => {
    const fitId = await fitOf(crew, 'helium');
    for (let round = 0; round < ROUNDS; round += 1) {
      const version = await approvedVersion(crew, fitId);
      winnerOf(await together(releasing(crew, version), releasing(crew, version), releasing(crew, version)));
      expect(await aftermathOf(crew.editor, version)).toEqual({
        status: 'RELEASED',
        releases: 1,
        current: 1,
        registrations: 1,
      });
    }
    expect(await releasedNumbers(crew.editor)).toEqual(Array.from({ length: ROUNDS }, (_, i) => `1.${i}`));
  });

  it('release a version or return it, never both', async () => {
    const fitId = await fitOf(crew, 'neon');
    for (let round = 0; round < ROUNDS; round += 1) {
      const version = await approvedVersion(crew, fitId);
      const isReleased = winnerOf(await together(releasing(crew, version), returning(crew, version))) === 0;
      expect(await aftermathOf(crew.editor, version)).toMatchObject({
        status: isReleased ? 'RELEASED' : 'RETURNED',
        releases: isReleased ? 1 : 0,
        registrations: isReleased ? 1 : 0,
      });
    }
  });

  it('release one of two versions of a sheet and send the other back', async () => {
    const fitId = await fitOf(crew, 'krypton');
    for (let round = 0; round < ROUNDS; round += 1) {
      const versions = [await approvedVersion(crew, fitId), await approvedVersion(crew, fitId)] as const;
      const winner = winnerOf(await together(releasing(crew, versions[0]), releasing(crew, versions[1])));
      const [won, lost] = winner === 0 ? versions : [versions[1], versions[0]];
      expect(await aftermathOf(crew.editor, won)).toMatchObject({ status: 'RELEASED', releases: 1, current: 1 });
      expect(await aftermathOf(crew.editor, lost)).toMatchObject({ status: 'RETURNED', releases: 0 });
    }
  });

  it('leave one chain of releases, each naming the one before it', async () => {
    const broken = await group.server.sql<object>(
      `SELECT FROM releases r LEFT JOIN releases before ON before.sequence = r.sequence - 1
        WHERE r.previous_hash IS DISTINCT FROM before.content_hash`,
    );
    const [row] = await group.server.sql<{ count: number; last: number }>(
      'SELECT count(*)::int, max(sequence)::int AS last FROM releases',
    );
    expect(broken).toEqual([]);
    expect(row!.count).toBe(row!.last);
    expect(row!.count).toBeGreaterThanOrEqual(2 * ROUNDS);
  });
});
