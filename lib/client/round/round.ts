import { v7 } from 'uuid';
import { apiPaths } from '@/lib/paths/paths';
import type { RoundDay, RoundField, RoundPerson, RoundPlanting, RoundRow } from '@/lib/schemas/round-day';
import { askDay, askPerson, type Asked } from './ask-server';
import type { KeptEntry, NewEntry } from './entry';
import { wallTimeAt } from './field-time';
import { keepEntries } from './keep-entry';
import { markerOfToday } from './markers';
import { mergeField } from './merge-field';
import { fieldBegunHere, mergePlanting } from './merge-planting';
import { mergeRow } from './merge-row';
import { asksFirst, personConfirmed } from './person-flag';
import { restrictedUntil } from './restricted-until';
import { dayKey, draftKey, RoundStore, type KeptPhoto } from './round-store';
import { sendEntries, type SendOutcome } from './send-entries';
import { sendPhotos } from './send-photos';
import { storageTrouble } from './storage-trouble';
import { removeUntried, withdrawalOf } from './undo-entry';
import { visitOfRow, type EntryVisit } from './visit-of-row';

export type RoundPhase = 'opening' | 'nobody' | 'no-organisation' | 'no-day' | 'ready' | 'update-needed' | 'store-away';
export type RoundTrouble = 'storage-full' | 'storage-refused';
export type Sending = { now: ReadonlySet<string>; last: SendOutcome['to'] | 'not-tried'; triedAt: number | null };

export type RoundPlace = { planting: RoundPlanting; field: RoundField; row: RoundRow };

type Doors = { fetch: typeof fetch; now: () => number; storeName?: string };

const firstWaitMilliseconds = 5_000;
const longestWaitMilliseconds = 300_000;
const personFact = 'person';
const shapeFact = 'store-shape';
/** Rises when what stands in the store changes its meaning for an older page. */
const storeShape = 1;
const signOutOwedFact = 'sign-out-owed';
const noEntries: readonly KeptEntry[] = [];

/**
 * The phone's whole working state, over its store: whose it is, what it took along, what it has kept, and how far sending
 * has come. Screens read it and are told of every change; every press that counts goes through `keep`.
 */
export class Round {
  phase: RoundPhase = 'opening';
  me: RoundPerson['person'] | null = null;
  organisations: RoundPerson['organisations'] = [];
  organisationId: string | null = null;
  day: RoundDay | null = null;
  trouble: RoundTrouble | null = null;
  sending: Sending = { now: new Set(), last: 'not-tried', triedAt: null };
  /** How far the phone's clock stands from the server's, in milliseconds, once one has answered; null before. */
  clockOffset: number | null = null;
  photos: readonly KeptPhoto[] = [];
  /** How many entries of other people wait on this phone; their content is not theirs who hold it now. */
  othersWaiting = 0;
  readonly store: RoundStore;

  private readonly doors: Doors;
  private readonly listeners = new Set<() => void>();
  private changes = 0;
  private entries = new Map<string, KeptEntry>();
  private byPlace = new Map<string, readonly KeptEntry[]>();
  private merged = new Map<string, { row: RoundRow; entries: readonly KeptEntry[]; answer: RoundRow }>();
  private drafts = new Map<string, unknown>();
  private draftsOnDisk = Promise.resolve();
  private waitMilliseconds = firstWaitMilliseconds;
  private timer: ReturnType<typeof setTimeout> | undefined;
  private sendingPass: Promise<void> | undefined;
  private nextPass: Promise<void> | undefined;
  private channel: BroadcastChannel | undefined;

  constructor(doors: Doors) {
    this.doors = doors;
    this.store = new RoundStore(doors.storeName);
  }

  readonly subscribe = (listener: () => void) => {
    this.listeners.add(listener);
    return () => this.listeners.delete(listener);
  };
  readonly version = () => this.changes;

  private tell() {
    this.changes += 1;
    for (const listener of this.listeners) listener();
  }

  /** Opens the store and shows what it holds; then, without waiting for it, asks the server. */
  async open(wantedOrganisationId: string | null): Promise<void> {
    try {
      await this.store.open();
      const shape = Number((await this.store.facts.get(shapeFact))?.value ?? storeShape);
      // A newer version has been here: what it keeps must not be read, or written into, as if it were ours.
      if (shape > storeShape) throw new Error('The store has a newer shape.');
      await this.store.facts.put({ name: shapeFact, value: storeShape });
      this.listenToOtherTabs();
      const kept = (await this.store.facts.get(personFact))?.value as RoundPerson | undefined;
      if (kept && !asksFirst()) await this.become(kept, wantedOrganisationId);
    } catch {
      this.phase = 'store-away';
      this.tell();
      return;
    }
    if (this.phase === 'opening') await this.askWho(wantedOrganisationId);
    if (this.phase === 'opening') this.showNobody();
    void this.wake();
  }

  private showNobody() {
    this.phase = 'nobody';
    this.tell();
  }

  private listenToOtherTabs() {
    if (typeof BroadcastChannel === 'undefined') return;
    this.channel = new BroadcastChannel('rowrise-round');
    this.channel.onmessage = ({ data }: MessageEvent<{ store: string; changed: string[] }>) => {
      if (data.store === this.store.name) void this.readAgain(data.changed);
    };
  }

  private async readAgain(operationIds: readonly string[]) {
    const found = await this.store.entries.bulkGet([...operationIds]);
    operationIds.forEach((id, index) => {
      const entry = found[index];
      if (entry && this.isMine(entry)) this.entries.set(id, entry);
      else this.entries.delete(id);
    });
    this.sortIntoPlaces();
    this.tell();
  }

  private isMine = (entry: { personId: string; organisationId: string }) => entry.personId === this.me?.id && entry.organisationId === this.organisationId;

  /** Asks the server who is signed in on this phone. Silence leaves everything as it was. */
  private async askWho(wantedOrganisationId: string | null): Promise<Asked<RoundPerson>['to']> {
    if ((await this.store.facts.get(signOutOwedFact))?.value === true) {
      if (!(await this.sendSignOut())) return 'no-answer';
    }
    const asked = await askPerson(this.doors.fetch);
    if (asked.to === 'answer') {
      this.noteServerTime(asked.serverTime);
      personConfirmed();
      await this.store.facts.put({ name: personFact, value: asked.answer });
      if (asked.answer.person.id !== this.me?.id || this.organisationId === null) await this.become(asked.answer, wantedOrganisationId);
      else this.organisations = asked.answer.organisations;
    } else if (asked.to === 'signed-out') {
      this.sending = { ...this.sending, last: 'signed-out' };
      if (this.me === null) this.showNobody();
    } else if (asked.to === 'update-needed') {
      this.phase = 'update-needed';
    }
    this.tell();
    return asked.to;
  }

  private noteServerTime(serverTime: number | null) {
    if (serverTime !== null) this.clockOffset = this.doors.now() - serverTime;
  }

  /** Makes the phone this person's: what others kept here stays in the store and out of sight. */
  private async become(person: RoundPerson, wantedOrganisationId: string | null) {
    this.me = person.person;
    this.organisations = person.organisations;
    const usual = (await this.store.facts.get(`organisation ${person.person.id}`))?.value;
    const wanted = wantedOrganisationId ?? this.organisationId ?? usual;
    const chosen = person.organisations.find((each) => each.id === wanted) ?? (person.organisations.length === 1 ? person.organisations[0] : undefined);
    if (chosen) await this.enter(chosen.id);
    else {
      this.organisationId = null;
      this.day = null;
      this.phase = 'no-organisation';
      this.tell();
    }
  }

  /** Goes to one of the person's organisations, with what the phone holds of it. */
  async enter(organisationId: string): Promise<void> {
    const { me } = this;
    if (!me) return;
    this.organisationId = organisationId;
    const [kept, entries, drafts, photos] = await Promise.all([
      this.store.days.get(dayKey(me.id, organisationId)),
      this.store.entries.where('[personId+organisationId+state]').between([me.id, organisationId, ''], [me.id, organisationId, '\uffff']).toArray(),
      this.store.drafts.where('[personId+organisationId]').equals([me.id, organisationId]).toArray(),
      this.store.photos.where('[personId+organisationId]').equals([me.id, organisationId]).toArray(),
    ]);
    this.entries = new Map(entries.sort((a, b) => a.deviceSequence - b.deviceSequence).map((entry) => [entry.operationId, entry]));
    this.drafts = new Map(drafts.map(({ name, draft }) => [name, draft]));
    this.photos = photos;
    this.day = kept?.day ?? null;
    this.sortIntoPlaces();
    this.phase = this.day ? 'ready' : 'no-day';
    this.tell();
    void this.countOthers();
    await this.store.facts.put({ name: `organisation ${me.id}`, value: organisationId });
  }

  private async countOthers() {
    const waiting = await this.store.entries.filter((entry) => entry.personId !== this.me?.id && entry.state !== 'sent').count();
    if (waiting !== this.othersWaiting) {
      this.othersWaiting = waiting;
      this.tell();
    }
  }

  private sortIntoPlaces() {
    const places = new Map<string, KeptEntry[]>();
    for (const entry of this.entries.values()) {
      const place = placeOf(entry);
      const standing = places.get(place);
      if (standing) standing.push(entry);
      else places.set(place, [entry]);
    }
    this.byPlace = places;
  }

  private putEntry(entry: KeptEntry) {
    const place = placeOf(entry);
    const before = this.byPlace.get(place) ?? noEntries;
    const known = this.entries.has(entry.operationId);
    this.entries.set(entry.operationId, entry);
    this.byPlace.set(place, known ? before.map((each) => (each.operationId === entry.operationId ? entry : each)) : [...before, entry]);
  }

  private dropEntry(entry: KeptEntry) {
    this.entries.delete(entry.operationId);
    const place = placeOf(entry);
    this.byPlace.set(place, (this.byPlace.get(place) ?? noEntries).filter((each) => each.operationId !== entry.operationId));
  }

  // ── Reading

  planting(plantingId: string): { planting: RoundPlanting; field: RoundField } | undefined {
    const own = this.byPlace.get(plantingId) ?? noEntries;
    const planting = mergePlanting(this.day, plantingId, own, this.me?.name ?? '');
    if (!planting || !this.me) return undefined;
    const field = this.day?.fields.find((each) => each.id === planting.fieldId) ?? fieldBegunHere(planting.fieldId, own);
    return { planting, field: mergeField(field, this.byPlace.get(field.id) ?? noEntries, this.me) };
  }

  /** Every planting, those begun on this phone among them. */
  plantingIds(): string[] {
    const begun = [...this.entries.values()].filter((entry) => entry.kind === 'spot-count.start').map((entry) => entry.thingId);
    return [...new Set([...(this.day?.plantings.map((each) => each.id) ?? []), ...begun])];
  }

  /** A row sample with what this phone kept on top of what the day brought; worked out again only where something changed. */
  row(row: RoundRow): RoundRow {
    const entries = this.byPlace.get(row.id) ?? noEntries;
    const known = this.merged.get(row.id);
    if (known && known.row === row && known.entries === entries) return known.answer;
    const answer = this.me ? mergeRow(row, entries, this.me) : row;
    this.merged.set(row.id, { row, entries, answer });
    return answer;
  }

  /** A planting with every row as this phone knows it, for what looks at several rows together. */
  whole(planting: RoundPlanting): RoundPlanting {
    return { ...planting, rows: planting.rows.map((row) => this.row(row)) };
  }

  place(plantingId: string, rowSampleId: string): RoundPlace | undefined {
    const found = this.planting(plantingId);
    const planting = found && this.whole(found.planting);
    const row = planting?.rows.find((each) => each.id === rowSampleId);
    return found && planting && row && { field: found.field, planting, row };
  }

  /** Whether an application keeps this person out of a field at this moment. */
  isClosed(field: RoundField): boolean {
    return this.me !== null && restrictedUntil(field, this.now(), this.me.id) !== undefined;
  }

  entriesOf(place: string): readonly KeptEntry[] {
    return this.byPlace.get(place) ?? noEntries;
  }

  entriesIn(...states: KeptEntry['state'][]): KeptEntry[] {
    return [...this.entries.values()].filter((entry) => states.includes(entry.state));
  }

  /** The count that was kept last in a planting on this phone and still stands; what undo speaks of. */
  lastCount(plantingId: string): KeptEntry | undefined {
    let last: KeptEntry | undefined;
    for (const entry of this.entries.values()) {
      if (entry.kind !== 'count.record' || entry.plantingId !== plantingId || entry.state === 'needs-look') continue;
      if (!last || entry.deviceSequence > last.deviceSequence) last = entry;
    }
    return last;
  }

  draft<T>(name: string): T | undefined {
    return this.drafts.get(name) as T | undefined;
  }

  /** Whether something is being typed that has not been kept. */
  hasDrafts(): boolean {
    return [...this.drafts.keys()].some((name) => !isPreference(name));
  }

  now(): { date: string; time: string; zone: string } {
    const zone = this.day?.organisation.timeZone ?? Intl.DateTimeFormat().resolvedOptions().timeZone;
    const wall = wallTimeAt(this.doors.now(), zone);
    // A demo stands on a day of its own; its clock goes on as everywhere.
    return { date: this.day?.organisation.demoToday ?? wall.date, time: wall.time, zone };
  }

  visit(row: RoundRow, marker: string | null): EntryVisit {
    return visitOfRow(this.entriesOf(row.id), this.now(), marker) ?? { id: v7(), personId: null, visitedOn: this.now().date, visitedAt: this.now().time, marker };
  }

  /** Today's marker in a planting: the one chosen, else the one in use, else the first color no visit has yet. */
  markerOf(planting: RoundPlanting): string | null {
    const { date } = this.now();
    const chosen = this.draft<{ marker: string | null }>(`marker ${planting.id} ${date}`);
    return chosen ? chosen.marker : markerOfToday(planting.rows, date);
  }

  // ── Writing

  /** Keeps entries; resolves when they are on the disk and only then. What it rejects with is said by `trouble`. */
  async keep(entries: readonly NewEntry[], options: { clearDrafts?: readonly string[]; photo?: KeptPhoto } = {}): Promise<KeptEntry[]> {
    const { me, organisationId } = this;
    if (!me || !organisationId) throw new Error('Nobody is signed in on this phone.');
    const occurred = this.now();
    try {
      await this.draftsOnDisk;
      const kept = await keepEntries(this.store, { personId: me.id, organisationId, occurred, keptAt: this.doors.now() }, entries, options);
      for (const entry of kept) this.putEntry(entry);
      for (const name of options.clearDrafts ?? []) this.drafts.delete(name);
      if (options.photo) this.photos = [...this.photos, options.photo];
      this.trouble = null;
      this.tellOtherTabs(kept);
      this.tell();
      this.wakeSoon();
      return kept;
    } catch (error) {
      this.trouble = storageTrouble(error);
      this.tell();
      throw error;
    }
  }

  /** A draft changes in memory at once and goes to the disk behind it, in the order of the presses. */
  setDraft(name: string, draft: unknown): Promise<void> {
    const { me, organisationId } = this;
    if (!me || !organisationId) return Promise.resolve();
    const key = draftKey(me.id, organisationId, name);
    if (draft === undefined) this.drafts.delete(name);
    else this.drafts.set(name, draft);
    this.tell();
    this.draftsOnDisk = this.draftsOnDisk.then(async () => {
      try {
        if (draft === undefined) await this.store.drafts.delete(key);
        else await this.store.drafts.put({ key, personId: me.id, organisationId, name, draft, changedAt: this.doors.now() });
      } catch (error) {
        this.trouble = storageTrouble(error);
        this.tell();
      }
    });
    return this.draftsOnDisk;
  }

  /** A choice that stays, such as today's marker; kept like a draft, but nothing waits for it. */
  setPreference(name: string, value: unknown): Promise<void> {
    return this.setDraft(name, value);
  }

  /** Takes an entry back in one press: forgotten where it never left the phone, else by an entry that takes it back. */
  async undo(entry: KeptEntry, reason: string): Promise<void> {
    if (await removeUntried(this.store, entry.operationId)) {
      this.dropEntry(entry);
      this.tellOtherTabs([entry]);
      this.tell();
      return;
    }
    const withdrawal = withdrawalOf(entry, v7(), reason);
    if (withdrawal) await this.keep([withdrawal]);
  }

  /** Sends an entry again that needed a look, with what was asked now answered or with another body. */
  async sendAgain(entry: KeptEntry, change: Partial<Pick<KeptEntry, 'body' | 'confirmations'>> = {}): Promise<void> {
    const again: KeptEntry = { ...entry, ...change, state: 'kept', answer: null };
    await this.store.entries.put(again);
    this.putEntry(again);
    this.tellOtherTabs([again]);
    this.tell();
    this.wakeSoon();
  }

  /** Lets an entry go that lost or was refused, after the scout has seen it and said so. */
  async letGo(entry: KeptEntry): Promise<void> {
    if (entry.state !== 'needs-look') return;
    await this.store.entries.delete(entry.operationId);
    this.dropEntry(entry);
    this.tellOtherTabs([entry]);
    this.tell();
  }

  /** Sends a photo again that the server would not have, or lets it go after the scout has seen it and said so. */
  async settlePhoto(photo: KeptPhoto, how: 'send-again' | 'let-go'): Promise<void> {
    if (how === 'let-go') await this.store.photos.delete(photo.photoId);
    else await this.store.photos.update(photo.photoId, { state: 'kept' });
    this.photos = this.photos.flatMap((each) => (each.photoId !== photo.photoId ? [each] : how === 'let-go' ? [] : [{ ...each, state: 'kept' as const }]));
    this.tell();
    this.wakeSoon();
  }

  private tellOtherTabs(entries: readonly KeptEntry[]) {
    this.channel?.postMessage({ store: this.store.name, changed: entries.map((entry) => entry.operationId) });
  }

  // ── Sending

  private wakeSoon() {
    this.waitMilliseconds = firstWaitMilliseconds;
    clearTimeout(this.timer);
    // A moment later, so that a press undone at once has not left, and presses in a row go together.
    this.timer = setTimeout(() => void this.wake(), 1_500);
  }

  /**
   * Sends all that waits and reads the day anew; one pass at a time over all tabs. Asked for during a pass, another one
   * follows, because what was kept meanwhile may have missed it.
   */
  wake(): Promise<void> {
    if (this.sendingPass) {
      this.nextPass ??= this.sendingPass.then(() => {
        this.nextPass = undefined;
        return this.wake();
      });
      return this.nextPass;
    }
    this.sendingPass = this.onlyOneTab(() => this.pass())
      .catch(() => undefined)
      .finally(() => {
        this.sendingPass = undefined;
      });
    return this.sendingPass;
  }

  private async onlyOneTab(work: () => Promise<void>): Promise<void> {
    if (typeof navigator === 'undefined' || !navigator.locks) return work();
    await navigator.locks.request('rowrise-round-send', { ifAvailable: true }, (lock) => (lock ? work() : undefined));
  }

  private async pass(): Promise<void> {
    clearTimeout(this.timer);
    const who = await this.askWho(this.organisationId);
    if (who === 'no-answer') return this.end({ to: 'no-answer' });
    if (who !== 'answer') return this.end({ to: 'signed-out' });
    const { me, organisationId } = this;
    if (!me || !organisationId) return;
    const outcome = await sendEntries({
      store: this.store,
      fetch: this.doors.fetch,
      now: this.doors.now,
      personId: me.id,
      organisationId,
      onSending: (ids) => {
        this.sending = { ...this.sending, now: new Set(ids) };
        this.tell();
      },
      onChange: (changed) => {
        for (const entry of changed) if (this.isMine(entry)) this.putEntry(entry);
        this.tellOtherTabs(changed);
        this.tell();
      },
    });
    if (outcome.to === 'done') await this.sendKeptPhotos(me.id, organisationId);
    if (outcome.to === 'done' || outcome.to === 'busy') await this.readDay(organisationId);
    this.end(outcome);
  }

  private async sendKeptPhotos(personId: string, organisationId: string) {
    await sendPhotos({ store: this.store, fetch: this.doors.fetch, personId, organisationId });
    this.photos = await this.store.photos.where('[personId+organisationId]').equals([personId, organisationId]).toArray();
    this.tell();
  }

  private end(outcome: SendOutcome) {
    this.sending = { now: new Set(), last: outcome.to, triedAt: this.doors.now() };
    this.tell();
    const waits = this.entriesIn('kept').length > 0 || this.photos.some((photo) => photo.state === 'kept');
    clearTimeout(this.timer);
    if (!waits && outcome.to === 'done') return;
    const wait = outcome.to === 'busy' && outcome.retryAfterSeconds !== null ? outcome.retryAfterSeconds * 1_000 : this.waitMilliseconds;
    this.waitMilliseconds = Math.min(this.waitMilliseconds * 2, longestWaitMilliseconds);
    this.timer = setTimeout(() => void this.wake(), wait);
  }

  /** Takes the newest day along; entries whose receipts had come before it was asked for stand in it and are let go. */
  private async readDay(organisationId: string): Promise<void> {
    const { me } = this;
    if (!me) return;
    const before = this.entriesIn('sent');
    const asked = await askDay(organisationId, this.doors.fetch);
    if (asked.to === 'update-needed') this.phase = 'update-needed';
    if (asked.to !== 'answer' || asked.answer.organisation.id !== organisationId) return this.tell();
    this.noteServerTime(asked.serverTime);
    await this.store.transaction('rw', this.store.days, this.store.entries, async () => {
      await this.store.days.put({ key: dayKey(me.id, organisationId), personId: me.id, organisationId, day: asked.answer, readAt: this.doors.now() });
      await this.store.entries.bulkDelete(before.map((entry) => entry.operationId));
    });
    if (this.organisationId !== organisationId || this.me?.id !== me.id) return;
    for (const entry of before) this.dropEntry(entry);
    this.day = asked.answer;
    this.phase = 'ready';
    this.tellOtherTabs(before);
    this.tell();
  }

  // ── Leaving

  private async sendSignOut(): Promise<boolean> {
    try {
      const response = await this.doors.fetch(apiPaths.signOut, {
        method: 'POST', headers: { 'Content-Type': 'application/json' }, body: '{}', redirect: 'error', signal: AbortSignal.timeout(10_000),
      });
      if (!response.ok || !/json/i.test(response.headers.get('content-type') ?? '')) return false;
      await this.store.facts.delete(signOutOwedFact);
      return true;
    } catch {
      return false;
    }
  }

  /** Signs out here at once; the server is told when it can be. Nothing that waits is cleared. */
  async signOut(): Promise<void> {
    await this.draftsOnDisk;
    await this.store.facts.put({ name: signOutOwedFact, value: true });
    await this.store.facts.delete(personFact);
    this.me = null;
    this.organisationId = null;
    this.day = null;
    this.entries.clear();
    this.byPlace.clear();
    this.drafts.clear();
    this.photos = [];
    await this.countOthers();
    this.showNobody();
    await this.sendSignOut();
  }

  close() {
    clearTimeout(this.timer);
    this.channel?.close();
    this.store.close();
  }
}

/** Choices lie among the drafts under names that begin with what they choose. */
const isPreference = (name: string) => /^(marker|tape-in-hand|entered|leaf) /.test(name);

/** Where an entry is looked up: its row sample, else its planting. */
function placeOf(entry: KeptEntry): string {
  return entry.rowSampleId ?? entry.plantingId ?? '';
}
