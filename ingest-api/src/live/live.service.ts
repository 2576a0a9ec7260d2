import { setImmediate as nextTurn } from 'node:timers/promises';
import { Injectable, type OnModuleDestroy } from '@nestjs/common';
import { type Observable, Subject } from 'rxjs';

export const liveTopics = ['results', 'breaches', 'stations', 'intake', 'mailbox'] as const;
export type LiveTopic = (typeof liveTopics)[number];

/** Says that something changed, never what: the dashboard asks again for what it shows. */
export interface LiveEvent {
  topic: LiveTopic;
  id: string | null;
}

/** Carries changes from wherever they happen to every open dashboard. Publish only after the commit. */
@Injectable()
export class LiveService implements OnModuleDestroy {
  private readonly subject = new Subject<LiveEvent>();

  /** Ends when the server stops. */
  readonly events: Observable<LiveEvent> = this.subject.asObservable();

  publish(event: LiveEvent): void {
    this.subject.next(event);
  }

  /** Open streams would hold up the stop: ended now, their connections are idle when the server closes those. */
  async onModuleDestroy(): Promise<void> {
    this.subject.complete();
    await nextTurn();
  }
}
