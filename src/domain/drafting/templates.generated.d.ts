type Compiled = Readonly<Record<string, TemplateSpecification>>;

export const TEMPLATES_VERSION: string;
export const notes: Compiled;
export const letters: Compiled;
export const partials: Compiled;
