/** Names of the templates that come with the package; each is `templates/NAME.md` in it. */
export const builtInTemplateNames: readonly string[] = ['audit']
