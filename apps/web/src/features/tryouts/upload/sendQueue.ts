import { paths, takeResponse, type CreateTakeRequest, type TakeResponse } from '@thudline/contracts';
import { ApiError, errorFrom, parseJson, refreshSession } from '../../../lib/apiClient';
import { postForm } from '../../upload/api/postForm';
import { takeForm } from '../../upload/takeBody';
import { progressed, uploadStarted, type UploadProgress } from '../../upload/uploadProgress';

export interface PairToSend {
  request: CreateTakeRequest;
  files: readonly File[];
}

export type SendState = 'waiting' | 'sending' | 'sent' | 'failed';

export interface SendJob extends PairToSend {
  state: SendState;
  sizeBytes: number;
  sentBytes: number;
  /** One sentence for people where the state is `failed`. */
  message: string;
}

/** The pairs of one try-out on their way; a new object for every change. */
export interface Sending {
  tryOutId: string;
  jobs: readonly SendJob[];
  /** Of all together, for the time left. */
  progress: UploadProgress;
}

interface Order {
  tryOutId: string;
  pairs: readonly PairToSend[];
  onSent: (take: TakeResponse) => void;
}

/** Enough to fill a home line, few enough that each take arrives soon. */
const atOnce = 2;

/**
 * Sends pairs one after another, two at a time, whatever page of this tab is open meanwhile. Each has its own upload key,
 * so sending one again never keeps it twice.
 */
export class SendQueue {
  private sending: Sending | null = null;
  private order: Order | null = null;
  private controller = new AbortController();
  private readonly listeners = new Set<() => void>();

  readonly subscribe = (listener: () => void) => {
    this.listeners.add(listener);
    return () => this.listeners.delete(listener);
  };
  readonly snapshot = (): Sending | null => this.sending;

  /** Starts anew with these pairs; what was on its way for another try-out is stopped. */
  start(order: Order, atMs = Date.now()): void {
    this.stop();
    this.controller = new AbortController();
    this.order = order;
    const jobs = order.pairs.map((pair): SendJob => ({
      ...pair,
      state: 'waiting',
      sizeBytes: pair.files.reduce((sum, { size }) => sum + size, 0),
      sentBytes: 0,
      message: '',
    }));
    this.tell({ tryOutId: order.tryOutId, jobs, progress: uploadStarted(atMs) });
    this.goOn();
  }

  /** What failed is tried once more. */
  again(): void {
    if (!this.sending) return;
    const jobs = this.sending.jobs.map((job): SendJob =>
      job.state === 'failed' ? { ...job, state: 'waiting', sentBytes: 0, message: '' } : job,
    );
    this.tell({ ...this.sending, jobs, progress: uploadStarted(Date.now()) });
    this.goOn();
  }

  stop(): void {
    this.controller.abort();
    this.order = null;
    this.tell(null);
  }

  private goOn(): void {
    const { sending } = this;
    if (!sending) return;
    const busy = sending.jobs.filter(({ state }) => state === 'sending').length;
    const next = sending.jobs.filter(({ state }) => state === 'waiting').slice(0, atOnce - busy);
    for (const job of next) void this.send(job.request.uploadKey);
  }

  private async send(uploadKey: string): Promise<void> {
    const { signal } = this.controller;
    const job = this.sending?.jobs.find(({ request }) => request.uploadKey === uploadKey);
    if (!job) return;
    this.change(uploadKey, { state: 'sending' });
    try {
      const take = await this.post(job, signal);
      if (signal.aborted) return;
      this.change(uploadKey, { state: 'sent', sentBytes: job.sizeBytes });
      this.order?.onSent(take);
    } catch (error) {
      if (signal.aborted) return;
      this.change(uploadKey, { state: 'failed', sentBytes: 0, message: failureWords(error) });
    }
    this.goOn();
  }

  private async post({ request, files, sizeBytes }: SendJob, signal: AbortSignal): Promise<TakeResponse> {
    const post = () =>
      postForm({
        path: paths.takes,
        form: takeForm(request, files),
        signal,
        onProgress: ({ loadedBytes }) => {
          if (!signal.aborted)
            this.change(request.uploadKey, { sentBytes: Math.min(sizeBytes, loadedBytes) });
        },
      });
    let answer = await post();
    if (answer.status === 401 && (await refreshSession())) answer = await post();
    const { status, text } = answer;
    if (status >= 200 && status < 300) return takeResponse.parse(parseJson(text));
    throw await errorFrom({ status, text: () => Promise.resolve(text) });
  }

  private change(uploadKey: string, change: Partial<SendJob>): void {
    if (!this.sending) return;
    const jobs = this.sending.jobs.map((job) =>
      job.request.uploadKey === uploadKey ? { ...job, ...change } : job,
    );
    const sum = (bytesOf: (job: SendJob) => number) => jobs.reduce((all, job) => all + bytesOf(job), 0);
    const report = {
      atMs: Date.now(),
      loadedBytes: sum(({ sentBytes }) => sentBytes),
      totalBytes: sum(({ sizeBytes }) => sizeBytes),
    };
    this.tell({ ...this.sending, jobs, progress: progressed(this.sending.progress, report) });
  }

  private tell(sending: Sending | null): void {
    this.sending = sending;
    for (const listener of this.listeners) listener();
  }
}

/** The tab's one queue: it outlives the page that filled it. */
export const sendQueue = new SendQueue();

function failureWords(error: unknown): string {
  if (error instanceof ApiError) return error.code === 'offline' ? 'The connection was lost.' : error.message;
  return 'That did not work. Try again in a moment.';
}
