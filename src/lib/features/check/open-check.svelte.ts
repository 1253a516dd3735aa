/**
 * One check on the screen: a draft that is kept with every keystroke, or a record that was kept and no longer
 * changes. It holds no rule of its own: what the answers come to is asked of the core through `answerCheck`.
 */
import { answerCheck, answerWithQuestion } from '$lib/records/answer-check';
import type { PlantSide } from '$lib/records/assemble';
import { noAnswers, type CheckAnswers } from '$lib/records/check';
import type { CheckRow, MachineRow, MaterialRow, PositionRow, RulesRow } from '$lib/records/mirror';
import { whichGears } from '$lib/records/which-gear';
import type { Draft, KeptRecord, LocalPerson, Tablet } from '$lib/tablet/start';

export type Loaded = 'draft' | 'kept' | 'not-here' | 'no-mirror';

export class OpenCheck {
	readonly #tablet: Tablet;
	readonly #person: LocalPerson;
	readonly id: string;

	loaded: Loaded | null = $state(null);
	draft: Draft | null = $state(null);
	record: KeptRecord | null = $state.raw(null);
	machine: MachineRow | null = $state.raw(null);
	position: PositionRow | null = $state.raw(null);
	materials: MaterialRow[] = $state.raw([]);
	rules: RulesRow | null = $state.raw(null);
	past: CheckRow[] = $state.raw([]);
	/** The answers before the last change of this step: what "undo" goes back to. */
	#before: { answers: CheckAnswers; entry: Draft['entry'] } | null = $state.raw(null);
	/** Why the last save failed; the screen says so at once. */
	saveFailed = $state(false);
	#saving: Promise<void> = Promise.resolve();

	answers: CheckAnswers = $derived(this.record?.record.body.answers ?? this.draft?.answers ?? noAnswers);
	material = $derived(this.materials.find(({ id }) => id === this.answers.materialId) ?? null);
	/** The moment the answers are judged at: when it was kept, or now. */
	moment = $derived(this.record?.record.performedAt ?? new Date().toISOString());
	/** What the plant brings to the check; null before the plant's rules were ever fetched. */
	#plantSide: PlantSide | null = $derived(
		this.rules && { material: this.material, rules: this.rules.rules, offered: this.materials }
	);
	#answered = $derived(this.#plantSide && answerWithQuestion(this.answers, this.#plantSide, this.moment));
	/** What the core is asked; of several gears that of the weakest, null while something is missing. */
	question = $derived(this.#answered?.question ?? null);
	outcome = $derived(this.record?.record.body.outcome ?? this.#answered?.outcome ?? null);
	/** What the readings say of the gear, and which gears the check is answered for. */
	which = $derived(whichGears(this.answers, this.rules?.rules.instruments));

	constructor(tablet: Tablet, person: LocalPerson, id: string) {
		this.#tablet = tablet;
		this.#person = person;
		this.id = id;
	}

	get editable(): boolean {
		return this.loaded === 'draft';
	}
	get canUndo(): boolean {
		return this.#before !== null && this.editable;
	}

	async load(): Promise<void> {
		const plant = this.#person.plantId;
		const [draft, record] = await Promise.all([
			this.#tablet.drafts.get(this.id),
			this.#tablet.records.get(plant, this.id)
		]);
		this.record = record ?? null;
		// What is on the screen is newer than what was read while it was being typed.
		const own = draft?.plantId === plant && draft.authorId === this.#person.personId;
		// A draft of an earlier version lacks the answers that came later.
		if (!this.draft && draft && own) this.draft = { ...draft, answers: { ...noAnswers, ...draft.answers } };
		if (record) this.draft = null;
		const of = record?.record.body ?? this.draft;
		if (!of) {
			this.loaded = 'not-here';
			return;
		}
		await this.readMirror(of.machineId, of.positionId);
		this.loaded = record ? 'kept' : 'draft';
	}

	/** Reads the plant's rows again: after a pull another revision of a material or rule may hold. */
	async readMirror(machineId: string, positionId: string): Promise<void> {
		const { mirror } = this.#tablet;
		const plant = this.#person.plantId;
		[this.machine, this.position, this.materials, this.rules, this.past] = await Promise.all([
			mirror.machine(plant, machineId),
			mirror.position(plant, positionId),
			mirror.materials(plant),
			mirror.rules(plant),
			mirror.checksAt(plant, positionId)
		]);
	}

	/** Changes answers and keeps them on the tablet at once; what was being typed becomes the answer, or goes. */
	answer(change: Partial<CheckAnswers>): void {
		this.set(change);
		this.setEntry(null);
	}

	/** Changes answers beside the reading that is being typed. */
	set(change: Partial<CheckAnswers>): void {
		if (!this.draft) return;
		this.#before = { answers: $state.snapshot(this.draft.answers), entry: $state.snapshot(this.draft.entry) };
		this.draft.answers = { ...this.draft.answers, ...change };
		this.#save();
	}

	/** Free text: every keystroke is kept, and undo goes back by field, not by letter. */
	setText(change: Partial<Pick<CheckAnswers, 'permit' | 'note'>>): void {
		if (!this.draft) return;
		this.draft.answers = { ...this.draft.answers, ...change };
		this.#save();
	}

	/** What stands in the number field and is not an answer yet. */
	setEntry(entry: Draft['entry']): void {
		if (!this.draft) return;
		this.draft.entry = entry;
		this.#save();
	}

	setStep(step: string): void {
		if (!this.draft || this.draft.step === step) return;
		this.draft.step = step;
		this.#before = null;
		this.#save();
	}

	undo(): void {
		if (!this.draft || !this.#before) return;
		this.draft.answers = this.#before.answers;
		this.draft.entry = this.#before.entry;
		this.#before = null;
		this.#save();
	}

	/** Keeps the check as a record; the promise resolves when it is on disk. */
	async keep(): Promise<void> {
		if (!this.draft || !this.rules || !this.#plantSide || !this.position || !this.machine) return;
		await this.#saving;
		const performedAt = new Date().toISOString();
		const draft = $state.snapshot(this.draft);
		const outcome = answerCheck(draft.answers, this.#plantSide, performedAt);
		await this.#tablet.keep({
			draft,
			performedAt,
			materialRevision: this.material?.revision ?? null,
			rulesRevision: this.rules.revision,
			outcome
		});
		this.draft = null;
		await this.load();
		this.#tablet.sync.nudge('kept');
	}

	/** One save after another, each of the state at its turn, so that an older one never lands last. */
	#save(): void {
		this.#saving = this.#saving.then(async () => {
			if (!this.draft) return;
			try {
				await this.#tablet.drafts.save($state.snapshot(this.draft));
				this.saveFailed = false;
			} catch (failure) {
				console.error(failure);
				this.saveFailed = true;
			}
		});
	}
}
