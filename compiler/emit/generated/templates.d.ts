// Made by bin/generate.ts from templates/slipway.
export type TemplateName = "aim" | "attr" | "constrain" | "control" | "drive" | "entry" | "foot_roll" | "geometry" | "group" | "joint" | "limit" | "line" | "lock" | "note" | "reach" | "scene" | "shape" | "show" | "skin" | "space" | "spline" | "twist" | "two_bone";
export declare const templates: Readonly<
  Record<TemplateName, (view: Readonly<Record<string, string | null>>) => string>
>;
