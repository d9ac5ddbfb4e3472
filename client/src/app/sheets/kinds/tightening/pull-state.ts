import { computed, inject, Injectable, linkedSignal } from '@angular/core';
import type { Quantity, Unit } from '@second-spanner/shared/contracts/quantity';
import type { EntryContent, TighteningStepDefinition } from '@second-spanner/shared/contracts/steps';
import { drawTightening, fastenerPositions } from '@second-spanner/shared/drawing/tightening';
import { convert } from '@second-spanner/shared/quantities/convert';
import { clicks } from '@second-spanner/shared/sheet/judge-tightening';
import { finalPass, lastPass, planOf } from '@second-spanner/shared/sheet/plan-of';
import { readFigure } from '../../../reading/read-figure';
import { SessionStore } from '../../../session/session-store';
import { draft } from '../../drafts/draft';
import { withCapital } from '../../entry-words';
import { SheetStore } from '../../sheet-store';
import { StepWork } from '../../step-work';
import { wrenchesOf } from '../../tools/tools-for';
import { ToolsStore } from '../../tools/tools-store';
import { chosenUnit, rememberUnit, unitsLike } from '../../units/chosen-unit';
import { bandIn } from '../measurement/band';
import { readAdapter, type AdapterDraft } from './adapter-fields';
import { withReading } from '../measurement/reading-draft';
import { isPullDraft, noPull } from './pull-draft';
import { pullCells } from './pull-cells';
import { atFastener, fastenerStates, passShown, pullOf, settingFor, slotsOfPass, toGo } from './pull';

/** The state of a tightening's page: which pull is at hand, what is typed for it, and what follows from that. */
@Injectable()
export class PullState {
  private readonly store = inject(SheetStore);
  private readonly work = inject(StepWork);
  private readonly tools = inject(ToolsStore);
  private readonly sessions = inject(SessionStore);

  private readonly typed = draft(() => this.work.draftKey('pull'), noPull, isPullDraft);

  private readonly definition = computed<TighteningStepDefinition | null>(() => {
    const definition = this.store.step()?.definition;
    return definition?.kind === 'tightening' ? definition : null;
  });
  /** The last torque pass is shut until the second person has read the wrench. */
  private readonly awaitsWitness = computed(() => {
    const [step, definition] = [this.store.step(), this.definition()];
    if (step === null || definition === null || step.done === step.of) return false;
    const isAwaited = step.waitsFor.some(({ what }) => what === 'second-check');
    return isAwaited && this.pull()?.pass === finalPass(definition);
  });
  readonly isEntering = computed(() => this.work.isOpen() && this.pull() !== null && !this.awaitsWitness());
  readonly pull = computed(() => {
    const [definition, slot] = [this.definition(), this.work.slot()];
    return definition === null || slot === null ? null : pullOf(definition, slot.key);
  });
  private readonly pass = computed(() => {
    const definition = this.definition();
    return definition === null ? 1 : passShown(definition, this.pull());
  });
  readonly noun = computed(() => this.definition()?.group.noun ?? '');
  readonly fastenerName = computed(() => withCapital(`${this.noun()} ${this.pull()?.fastener ?? ''}`));
  readonly name = computed(() => {
    const [definition, title] = [this.definition(), this.store.step()?.title ?? ''];
    const passes = definition === null ? 1 : lastPass(definition);
    return passes > 1 && this.isEntering() ? `${title}, pass ${this.pass()} of ${passes}` : title;
  });

  readonly toolId = linkedSignal(() => this.tools.lastFor('tightening'));
  readonly tool = computed(() => this.tools.byId(this.toolId()));
  readonly wrenches = computed(() => wrenchesOf(this.tools.all()));
  readonly isClick = computed(() => {
    const tool = this.tool();
    return tool !== undefined && clicks(tool);
  });
  private readonly printed = computed<Unit>(() => this.definition()?.torque.unit ?? 'N·m');
  readonly unit = linkedSignal<Unit>(() => chosenUnit(this.printed()));
  readonly units = computed(() => unitsLike(this.printed()));
  readonly adapterDraft = computed(() => this.typed().adapter);
  private readonly adapter = computed(() => readAdapter(this.typed().adapter));
  private readonly found = computed(() =>
    settingFor(this.pull()?.target, this.tool(), this.adapter().adapter, this.unit()),
  );
  /** What the wrench must be set to or show; not said where it is simply the target. */
  readonly needed = computed(() => (this.isClick() || this.adapter().adapter ? this.found().setting : null));
  readonly adapterError = computed(() => this.found().error?.message ?? null);

  readonly text = computed(() => {
    const { pass, setting, readings } = this.typed();
    if (this.isSet()) return pass === String(this.pass()) ? setting : '';
    return readings[this.work.slot()?.key ?? ''] ?? '';
  });
  readonly fieldLabel = computed(() => {
    if (this.isSet()) return 'The wrench is set to';
    return `Reading, ${this.noun()} ${this.pull()?.fastener ?? ''}`;
  });
  readonly content = computed<EntryContent | null>(() => {
    const [pull, text] = [this.pull(), this.text()];
    if (pull === null || !this.adapter().isWhole) return null;
    const common = {
      kind: 'tightening' as const,
      pass: pull.pass,
      fastener: pull.fastener,
      toolId: this.toolId(),
    };
    if (pull.angle !== undefined) {
      const angle = Number(text.trim().replace(',', '.').replace('°', ''));
      return text.trim() === '' || !Number.isFinite(angle) ? null : { ...common, angle };
    }
    const { quantity } = readFigure(text, this.unit());
    const adapter = this.adapter().adapter;
    return quantity && { ...common, [this.isClick() ? 'setting' : 'reading']: quantity, adapter };
  });
  private readonly judged = computed(() => {
    const [definition, content] = [this.definition(), this.content()];
    return definition === null || content === null ? null : this.work.judge(definition, content);
  });
  readonly judgement = computed(() => this.judged()?.judgement ?? null);
  readonly valueError = computed(() => {
    const field = this.judged()?.error?.field ?? '';
    const isOfValue = /^content\.(reading|setting|angle)/.test(field);
    if (isOfValue) return this.judged()?.error?.message ?? null;
    return (
      ['reading', 'setting', 'angle']
        .map((name) => this.work.errorAt(`content.${name}`))
        .find((error) => error !== null) ?? null
    );
  });
  readonly toolError = computed(() => this.work.errorAt('content.toolId'));

  /** How many are still to be pulled in the pass, the one at hand among them. */
  readonly toGo = computed(() => toGo(this.work.slots(), this.pass()));
  readonly passSlots = computed(() => {
    const definition = this.definition();
    if (definition === null) return [];
    return slotsOfPass(this.work.slots(), this.pass()).map(({ key, entry }) => ({
      key,
      words: `${withCapital(this.noun())} ${pullOf(definition, key)?.fastener ?? ''}${entry === null ? '' : ', done'}`,
    }));
  });
  readonly drawing = computed(() => {
    const definition = this.definition();
    const plan = definition === null ? { sequence: [], basis: 'maker' as const } : planOf(definition);
    return drawTightening(
      {
        plan,
        positions: definition === null ? [] : fastenerPositions(definition.plan.fasteners),
        outline: definition?.group.outline ?? 'plain',
        numbers: 'name',
        states:
          definition === null
            ? {}
            : fastenerStates(
                definition,
                this.work.slots(),
                this.pass(),
                this.isEntering() ? (this.work.slot()?.key ?? null) : null,
                this.isEntering() ? (this.work.following()?.key ?? null) : null,
              ),
        title: this.store.step()?.title,
      },
      { dialect: this.sessions.dialect() },
    );
  });
  readonly band = computed(() => {
    const [pull, content, tool] = [this.pull(), this.content(), this.tool()];
    if (pull === null || (pull.low === undefined && pull.high === undefined)) return null;
    const shown = content?.kind === 'tightening' ? (content.reading ?? content.setting) : undefined;
    const readings =
      shown === undefined || tool === undefined || this.judged()?.error
        ? []
        : [
            {
              value: atFastener(shown, tool, this.adapter().adapter),
              tool,
              role: 'first' as const,
              label: this.isClick() ? 'set' : 'reading',
              verdict: this.judgement()?.verdict,
            },
          ];
    return bandIn(pull, this.unit(), readings, { dialect: this.sessions.dialect() });
  });
  readonly bandCaption = computed(() =>
    this.adapter().adapter ? `At the ${this.noun()}, beyond the adapter` : null,
  );

  private readonly cells = computed(() =>
    pullCells(this.definition(), this.pull(), this.tool(), this.unit()),
  );
  readonly deskCells = computed(() => this.cells().desk);
  readonly phoneCells = computed(() => (this.isEntering() ? this.cells().phone : []));
  readonly keepWords = computed(() => {
    const [definition, following] = [this.definition(), this.work.following()];
    const done = this.isSet() ? 'Pulled to the click' : 'Keep it';
    const next = definition === null || following === null ? null : pullOf(definition, following.key);
    if (next === null) return done;
    return next.pass === this.pass()
      ? `${done}, go to ${this.noun()} ${next.fastener}`
      : `${done}, go to pass ${next.pass}`;
  });

  /** A target in the unit of choice. */
  inUnit(target: Quantity): Quantity {
    return convert(target, this.unit());
  }

  type(text: string): void {
    this.work.touched();
    this.typed.update((typed) =>
      this.isSet()
        ? { ...typed, pass: String(this.pass()), setting: text }
        : { ...typed, readings: withReading(typed.readings, this.work.slot()?.key ?? '', text) },
    );
  }

  takeAdapter(adapter: AdapterDraft): void {
    this.typed.update((typed) => ({ ...typed, adapter }));
  }

  takeUnit(unit: Unit): void {
    this.unit.set(unit);
    rememberUnit(this.printed(), unit);
  }

  takeTool(toolId: string): void {
    this.work.touched();
    this.toolId.set(toolId);
    this.tools.rememberFor('tightening', toolId);
  }

  chooseFastener(fastener: string): void {
    this.work.choose(`pull/${this.pass()}/${fastener}`);
  }

  /** Keeps the pull; true when it is kept and the next one may be typed. */
  async keep(): Promise<boolean> {
    const [definition, content] = [this.definition(), this.content()];
    const error = this.judged()?.error ?? null;
    this.work.fieldError.set(error);
    if (definition === null || content === null || error !== null) return false;
    const slot = this.work.slot()?.key ?? '';
    const isKept = await this.work.record(definition, content);
    if (isKept) this.typed.update((typed) => ({ ...typed, readings: withReading(typed.readings, slot, '') }));
    return isKept;
  }

  /** A click wrench is set once a pass; everything else is read at each fastener. */
  private isSet(): boolean {
    return this.isClick() && this.pull()?.angle === undefined;
  }
}
