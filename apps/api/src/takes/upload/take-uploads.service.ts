import { Inject, Injectable } from '@nestjs/common';
import { createTakeRequest, CreateTakeRequest, uploadLimits } from '@thudline/contracts';
import { Request, Response } from 'express';
import multer from 'multer';
import { Config } from '../../config/config';
import { CONFIG } from '../../config/config.module';
import { AppError } from '../../errors/app-error';
import { invalidInput } from '../../errors/invalid-input';
import { ScratchService } from '../../storage/scratch.service';
import { safeFileName } from './safe-file-name';
import { ReceivedFile, ScratchStorage } from './scratch-storage';
import { tooLarge, uploadError } from './upload-errors';

export interface TakeUpload {
  request: CreateTakeRequest;
  files: ReceivedFile[];
}

/** Room for the text fields and the boundaries of a multipart body. */
export const textBytes = 256 * 1024;

/** Receives an upload into scratch, hands it on, and removes the scratch whatever happens. */
@Injectable()
export class TakeUploadsService {
  constructor(
    private readonly scratch: ScratchService,
    @Inject(CONFIG) private readonly config: Config,
  ) {}

  async receive<T>(
    request: Request,
    response: Response,
    use: (upload: TakeUpload) => Promise<T>,
  ): Promise<T> {
    this.refuseByLength(request);
    const folder = await this.scratch.make('upload');
    try {
      return await use(await this.parse(request, response, folder));
    } finally {
      await this.scratch.remove(folder);
    }
  }

  /** Where the length is told, too much is refused before the body is read. */
  private refuseByLength(request: Request): void {
    const limitBytes = uploadLimits.maxFiles * this.config.maxFileBytes + textBytes;
    if (Number(request.get('Content-Length') ?? 0) > limitBytes) throw tooLarge(this.config.maxFileBytes);
  }

  private async parse(request: Request, response: Response, folder: string): Promise<TakeUpload> {
    let fields: CreateTakeRequest | null = null;
    let filesSoFar = 0;
    const receive = multer({
      storage: new ScratchStorage(folder),
      limits: {
        fileSize: this.config.maxFileBytes,
        files: uploadLimits.maxFiles,
        fields: 20,
        fieldSize: textBytes,
      },
      defParamCharset: 'utf8',
      // The text fields come first: what is wrong with them is told before a file is received.
      fileFilter: (_request, _file, accept) => {
        filesSoFar += 1;
        try {
          fields ??= parseFields(request.body);
          accept(null, true);
        } catch (error) {
          accept(error as Error);
        }
      },
    }).array('files');
    await new Promise<void>((resolve, reject) => {
      receive(request, response, (error: unknown) => {
        if (error) reject(uploadError(error, this.config.maxFileBytes, filesSoFar - 1));
        else resolve();
      });
    });
    return { request: fields ?? parseFields(request.body), files: receivedFiles(request.files) };
  }
}

function parseFields(body: unknown): CreateTakeRequest {
  const texts = (body ?? {}) as Record<string, unknown>;
  const parsed = createTakeRequest.safeParse({
    ...texts,
    tracks: parseJson(texts.tracks),
    doneActions: parseJson(texts.doneActions),
    tags: parseJson(texts.tags),
  });
  if (!parsed.success) throw invalidInput(parsed.error);
  return parsed.data;
}

/** What is no JSON stays the text it is, for the contract to refuse. */
function parseJson(text: unknown): unknown {
  try {
    return typeof text === 'string' ? JSON.parse(text) : undefined;
  } catch {
    return text;
  }
}

function receivedFiles(files: Request['files']): ReceivedFile[] {
  const received = (Array.isArray(files) ? files : []) as (Express.Multer.File & ReceivedFile)[];
  if (received.length === 0) throw new AppError('bad-request', 'Add the recordings: one or two WAV files.');
  return received.map(({ originalname, path, bytes, sha256 }) => ({
    name: safeFileName(originalname),
    path,
    bytes,
    sha256,
  }));
}
