// Made by bin/generate.ts from templates/slipway.
export type TemplateName = "attr" | "constrain" | "control" | "entry" | "group" | "joint" | "limit" | "line" | "lock" | "note" | "scene" | "show" | "solve";
export declare const templates: Readonly<
  Record<TemplateName, (view: Readonly<Record<string, string | null>>) => string>
>;
