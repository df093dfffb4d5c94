import { EntityManager } from '@mikro-orm/postgresql';
import { Injectable } from '@nestjs/common';
import { createSetupRequest, emptySetup, ListSetupsResponse, maxSetups } from '@thudline/contracts';
import { SetupResponse, UpdateSetupRequest } from '@thudline/contracts';
import { validate } from 'uuid';
import { z } from 'zod';
import { Viewer } from '../access/viewer';
import { AppError, notFound } from '../errors/app-error';
import { PhotosService } from '../photos/photos.service';
import { User } from '../users/entities/user.entity';
import { Setup } from './entities/setup.entity';
import { SetupUses } from './setup-use';
import { changedFields, fieldsOf, setupListItemOf, setupResponseOf } from './setups.mapper';

@Injectable()
export class SetupsService {
  constructor(
    private readonly em: EntityManager,
    private readonly uses: SetupUses,
    private readonly photos: PhotosService,
  ) {}

  async list({ user }: Viewer): Promise<ListSetupsResponse> {
    const [setups, uses, { currentSetupId }] = await Promise.all([
      this.em.find(Setup, { owner: user.id }, { orderBy: { id: 'desc' } }),
      this.uses.ofAll(user.id),
      this.em.findOneOrFail(User, user.id),
    ]);
    const lastUsed = ({ id }: Setup) => uses.get(id)?.lastUsedAt.getTime() ?? 0;
    const sorted = [...setups].sort((one, other) => lastUsed(other) - lastUsed(one));
    return {
      items: sorted.map((setup) => setupListItemOf(setup, uses.get(setup.id))),
      currentId: setups.find(({ id }) => id === currentSetupId)?.id ?? null,
    };
  }

  async get(viewer: Viewer, setupId: string): Promise<SetupResponse> {
    return this.whole(await this.own(viewer, setupId));
  }

  /** What isn't said is empty, also in a copy: a copy carries its own numbers and remembers where they came from. */
  async create(viewer: Viewer, request: z.output<typeof createSetupRequest>): Promise<SetupResponse> {
    const { copiedFromId, ...fields } = request;
    const count = await this.em.count(Setup, { owner: viewer.user.id });
    if (count >= maxSetups)
      throw new AppError('conflict', `You have ${maxSetups} setups. Remove one that you don’t use any more.`);
    const copiedFrom = copiedFromId ? await this.own(viewer, copiedFromId) : null;
    const setup = this.em.create(Setup, {
      owner: this.em.getReference(User, viewer.user.id),
      ...changedFields(emptySetup, { ...fields, name: fields.name || `Setup ${count + 1}` }),
      copiedFrom,
    });
    await this.em.flush();
    return this.whole(setup);
  }

  async update(viewer: Viewer, setupId: string, changes: UpdateSetupRequest): Promise<SetupResponse> {
    const setup = await this.own(viewer, setupId);
    this.em.assign(setup, changedFields(fieldsOf(setup), changes));
    await this.em.flush();
    return this.whole(setup);
  }

  /** Takes keep what they were recorded with, so that it can't be lost by tidying up. */
  async remove(viewer: Viewer, setupId: string): Promise<void> {
    const setup = await this.own(viewer, setupId);
    const { takeCount } = await this.uses.of(setupId);
    if (takeCount > 0)
      throw new AppError(
        'conflict',
        `${takeCount === 1 ? 'A take was' : `${takeCount} takes were`} recorded with this setup. Give ${takeCount === 1 ? 'it' : 'them'} another one first.`,
      );
    const photo = setup.photo?.unwrap();
    await this.em.removeAndFlush(setup);
    if (photo) await this.photos.remove(photo);
  }

  async addPhoto(viewer: Viewer, setupId: string, received: Buffer): Promise<SetupResponse> {
    const setup = await this.own(viewer, setupId);
    const old = setup.photo?.unwrap() ?? null;
    await this.photos.replace(viewer, { received, old, use: (photo) => this.em.assign(setup, { photo }) });
    return this.whole(setup);
  }

  async removePhoto(viewer: Viewer, setupId: string): Promise<SetupResponse> {
    const setup = await this.own(viewer, setupId);
    const photo = setup.photo?.unwrap();
    setup.photo = null;
    if (photo) await this.photos.remove(photo);
    return this.whole(setup);
  }

  /** @throws {AppError} `not-found` where it is somebody else's, too */
  private async own({ user }: Viewer, setupId: string): Promise<Setup> {
    if (!validate(setupId)) throw notFound();
    const setup = await this.em.findOne(
      Setup,
      { id: setupId, owner: user.id },
      { populate: ['photo', 'copiedFrom'] },
    );
    if (!setup) throw notFound();
    return setup;
  }

  private async whole(setup: Setup): Promise<SetupResponse> {
    await this.em.populate(setup, ['photo', 'copiedFrom']);
    return setupResponseOf(setup, await this.uses.of(setup.id));
  }
}
