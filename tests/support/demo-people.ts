/** The demo team's sign-ins, as the README gives them. */
export const demoPassword = 'kerb-and-apex-14';
export const engineer = { email: 'mira@heron-racing.example', password: demoPassword };
export const reviewer = { email: 'jonas@heron-racing.example', password: demoPassword };
export const crew = { email: 'tove@heron-racing.example', password: demoPassword };
