import type { FindingList } from '../findings/FindingList';
import type { Rig, RigScene, TurnChannel } from '../rig/Rig';
import type { Span } from '../source/SourceText';
import { checkRange, checkTurn, type RangedStep } from './checkNumbers';
import { slipwayFindings } from './findings';
import { draftNode, finishNode, type NodeDraft, type NodeStep } from './NodeDraft';
import type { PlacedStep } from './readStep';
import type { SceneNames } from './SceneNames';
import type { Step, StepOf } from './Step';

/** What links the nodes of a rig. */
export type RigLinks = Pick<Rig, 'constraints' | 'solvers' | 'spaces' | 'drivers' | 'skins' | 'shapes'>;

type Placed<V extends Step['verb']> = PlacedStep<StepOf<V>>;

/**
 * Carries out the steps that make nodes and say things about them. A step that does not fit is a finding and changes
 * nothing, so that the rest can be checked too.
 */
export class SceneBuilder {
  readonly #findings: FindingList;
  readonly #names: SceneNames;
  readonly #drafts = new Map<string, NodeDraft>();
  #scene: RigScene | null = null;

  constructor(names: SceneNames, findings: FindingList) {
    this.#names = names;
    this.#findings = findings;
  }

  openScene({ step }: Placed<'scene'>): void {
    const { recipe, house, up, forward, unit, compiler } = step.values;
    const { recipe_hash: recipeHash, house_hash: houseHash } = step.values;
    this.#scene = { character: step.name, recipe, house, up, forward, unit, recipeHash, houseHash, compiler };
  }

  addNode(placed: PlacedStep<NodeStep>): void {
    const { step, line } = placed;
    const { parent, turn } = step.values;
    const hangs = parent === null || this.#names.isNode(parent, placed.spanOf('parent'), line);
    const isTurned = checkTurn(turn, placed.spanOf('turn'), this.#findings);
    const hasEnds =
      step.verb !== 'line' ||
      [this.#isNode(placed, 'from', step.values.from), this.#isNode(placed, 'to', step.values.to)].every(
        Boolean,
      );
    // The name is taken even by a node with faults: what refers to it is not at fault.
    if (this.#names.take(placed, step.verb) && hangs && isTurned && hasEnds) {
      this.#drafts.set(step.name, draftNode(step));
    }
  }

  addAttribute(placed: Placed<'attr'>): void {
    const { name, default: initial, min, max, labels, note } = placed.step.values;
    const inRange = checkRange(placed as PlacedStep<RangedStep>, this.#findings);
    const draft = this.#draftOf(placed, 'control');
    if (draft === undefined || !inRange) return;
    if (draft.attributes.some((attribute) => attribute.name === name)) {
      this.#reportRepeated(placed, `The attribute "${name}"`, placed.spanOf('name'));
    } else draft.attributes.push({ name, default: initial, min, max, labels, note });
  }

  limitChannel(placed: Placed<'limit'>): void {
    const { channel, min, max } = placed.step.values;
    const inRange = checkRange(placed as PlacedStep<RangedStep>, this.#findings);
    const draft = this.#draftOf(placed, null);
    if (draft === undefined || !inRange) return;
    if (draft.step.verb === 'joint' && isTurn(channel)) {
      if (draft.limits.has(channel)) {
        this.#reportRepeated(placed, `The limit of "${channel}"`, placed.spanOf('channel'));
      } else draft.limits.set(channel, { min, max });
      return;
    }
    // Anything but a control, or a joint's turn, has no such channel.
    if (this.#draftOf(placed, 'control') === undefined) return;
    if (draft.limited.has(channel)) {
      this.#reportRepeated(placed, `The limit of "${channel}"`, placed.spanOf('channel'));
      return;
    }
    draft.limited.add(channel);
    draft.channels.set(channel, { locked: draft.channels.get(channel)?.locked ?? false, min, max });
  }

  lockChannels(placed: Placed<'lock'>): void {
    const draft = this.#draftOf(placed, 'control');
    if (draft === undefined) return;
    for (const channel of placed.step.values.channels) {
      const rule = draft.channels.get(channel) ?? { locked: false, min: null, max: null };
      if (rule.locked) this.#reportRepeated(placed, `The lock of "${channel}"`, placed.spanOf('channels'));
      else draft.channels.set(channel, { ...rule, locked: true });
    }
  }

  showNode(placed: Placed<'show'>): void {
    const draft = this.#draftOf(placed, null);
    if (draft === undefined) return;
    if (draft.showGiven) this.#reportRepeated(placed, 'What is shown', placed.span);
    draft.shown = placed.step.values.shown;
    draft.selectable = placed.step.values.selectable;
    draft.showGiven = true;
  }

  addEntry(placed: Placed<'entry'>): void {
    const { key, value } = placed.step.values;
    const draft = this.#draftOf(placed, 'note');
    if (draft === undefined) return;
    if (draft.entries.some((entry) => entry.key === key)) {
      this.#reportRepeated(placed, `The note "${key}"`, placed.spanOf('key'));
    } else draft.entries.push({ key, value });
  }

  /** The step that made the joint, or undefined when there is no sound one of that name. */
  findNode(name: string): NodeStep | undefined {
    return this.#drafts.get(name)?.step;
  }

  /** Whether a control has an attribute. */
  hasAttribute(control: string, attribute: string): boolean {
    return this.#drafts.get(control)?.attributes.some(({ name }) => name === attribute) ?? false;
  }

  /** The rig of all steps carried out; null without a scene. Sound only when nothing was reported. */
  finish({ constraints, solvers, spaces, drivers, skins, shapes }: RigLinks): Rig | null {
    if (this.#scene === null) return null;
    const nodes = [...this.#drafts.values()].map(finishNode);
    return { scene: this.#scene, nodes, constraints, solvers, spaces, drivers, skins, shapes };
  }

  #isNode(placed: PlacedStep, key: string, name: string): boolean {
    return this.#names.isNode(name, placed.spanOf(key), placed.line);
  }

  #draftOf(placed: PlacedStep, kind: 'control' | 'note' | null): NodeDraft | undefined {
    const { name } = placed.step;
    return this.#names.isNode(name, placed.nameSpan, placed.line, kind) ? this.#drafts.get(name) : undefined;
  }

  #reportRepeated(placed: PlacedStep, what: string, span: Span): void {
    const parameters = { what, name: placed.step.name };
    this.#findings.report(slipwayFindings, 'script-statement-repeated', span, parameters);
  }
}

function isTurn(channel: string): channel is TurnChannel {
  return channel === 'rx' || channel === 'ry' || channel === 'rz';
}
