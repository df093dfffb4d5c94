import { EntityManager } from '@mikro-orm/postgresql';
import { Injectable } from '@nestjs/common';
import { SameFilesRequest, SameFilesResponse } from '@thudline/contracts';
import { Viewer } from '../access/viewer';

interface SameFileRow {
  sha256: string;
  id: string;
  number: number;
  title: string;
}

/** Files that are in a take already, known by what is in them. */
@Injectable()
export class SameFilesService {
  constructor(private readonly em: EntityManager) {}

  async same({ user }: Viewer, { sha256 }: SameFilesRequest): Promise<SameFilesResponse> {
    const marks = sha256.map(() => '?').join(', ');
    const rows = await this.em.getConnection().execute<SameFileRow[]>(
      `select distinct on (f.sha256) f.sha256, t.id, t.number, t.title
       from take_file f join take t on t.id = f.take_id
       where f.sha256 in (${marks}) and t.owner_id = ? and t.deleted_at is null
       order by f.sha256, t.number desc`,
      [...sha256, user.id],
    );
    return { items: rows.map(({ sha256: hash, ...take }) => ({ sha256: hash, take })) };
  }
}
