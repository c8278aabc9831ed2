import type {
  ChainSpecification,
  ConstraintSpecification,
  ControlSpecification,
  DriverSpecification,
  GeometrySpecification,
  GuideLineSpecification,
  ShapeSpecification,
  SkinSpecification,
  SolverSpecification,
} from '../expand/types';
import type { EvaluatedLandmark, EvaluatedRecipe } from '../expressions/EvaluatedRecipe';
import type { FindingDeclaration } from '../findings/catalogue';
import type { Fix, RelatedPlace } from '../findings/Finding';
import type { ResolveContext } from '../resolve/Reporter';
import type { ResolvedRecipe } from '../resolve/types';
import type { Parameter } from '../schema/generated/recipeTypes';
import type { SolvedRecipe } from '../solve/types';
import type { Path } from '../syntax/types';
import type { ExpressionNames } from './namesInExpressions';

/** What a rule may read and how it speaks. Rules cannot change anything. */
export interface RuleContext {
  readonly recipe: EvaluatedRecipe;
  readonly resolved: ResolvedRecipe;
  /** Rest places in the scene's axes and unit; what could not be placed is missing. */
  readonly solved: SolvedRecipe;
  readonly stage: ResolveContext;
  /** False when entries were refused: then nothing can be called missing or unused. */
  readonly isWhole: boolean;
  /** Names that expressions read, listed when first asked for. */
  expressionNames(): ExpressionNames;
  /** Reports the rule's own code at a path of the recipe. */
  report(
    path: Path,
    parameters: Readonly<Record<string, string | number>>,
    more?: {
      readonly part?: 'key' | 'value';
      readonly related?: readonly RelatedPlace[];
      readonly fix?: Fix;
    },
  ): void;
}

/** One value of a collection of the recipe, as it was written, with its expressions worked out. */
export type EntryOf<Key extends 'roles' | 'containers' | 'parts' | 'controls'> = NonNullable<
  EvaluatedRecipe[Key]
>[string];

/**
 * Called once for each thing of its kind, in the order of the recipe; `finish` once at the end. Handlers that take a
 * name or an id get what was written, refused entries left out; the others get primitives, whoever made them.
 */
export interface RuleHandlers {
  parameter?(name: string, entry: Parameter): void;
  landmark?(name: string, entry: EvaluatedLandmark): void;
  role?(id: string, entry: EntryOf<'roles'>): void;
  container?(id: string, entry: EntryOf<'containers'>): void;
  part?(id: string, entry: EntryOf<'parts'>): void;
  controlEntry?(id: string, entry: EntryOf<'controls'>): void;
  chain?(chain: ChainSpecification): void;
  control?(control: ControlSpecification): void;
  solver?(solver: SolverSpecification): void;
  constraint?(constraint: ConstraintSpecification): void;
  driver?(driver: DriverSpecification): void;
  geometry?(mesh: GeometrySpecification): void;
  skin?(skin: SkinSpecification): void;
  shape?(shape: ShapeSpecification): void;
  guideLine?(line: GuideLineSpecification): void;
  finish?(): void;
}

/** What a rule is about, for the list of rules in the handbook. */
export type RuleCategory = 'animator' | 'structure' | 'motion' | 'geometry' | 'tidiness';

/** One lint rule. Its file name is its code; its page lies beside it. */
export interface Rule extends FindingDeclaration {
  readonly code: string;
  readonly category: RuleCategory;
  create(context: RuleContext): RuleHandlers;
}
