import type { Page } from 'playwright-core';

/** What a person does on any screen, named as they would say it. */
export class Visitor {
  constructor(
    readonly page: Page,
    readonly url: string,
  ) {}

  async open(path: string): Promise<void> {
    await this.page.goto(`${this.url}${path}`);
  }

  button(name: string | RegExp) {
    return this.page.getByRole('button', { name, exact: typeof name === 'string' }).first();
  }

  async press(name: string | RegExp): Promise<void> {
    await this.button(name).click();
  }

  async fill(label: string, text: string): Promise<void> {
    await this.page.getByLabel(label, { exact: true }).fill(text);
  }

  async sees(text: string | RegExp): Promise<void> {
    await this.page.getByText(text).first().waitFor();
  }

  /** Signs in on the page where it is asked for. */
  async signIn({ email, password }: { email: string; password: string }): Promise<void> {
    await this.fill('E-mail', email);
    await this.fill('Password', password);
    await this.press('Sign in');
  }

  /** A session without the sign-in page, where that is not what is tested. */
  async isSignedInAs(person: { email: string; password: string }): Promise<void> {
    const answer = await this.page.request.post(`${this.url}/api/auth/sign-in/email`, { data: person, headers: { origin: this.url } });
    if (!answer.ok()) throw new Error(`sign-in answered ${answer.status()}: ${await answer.text()}`);
  }

  /** A project that this person may see, by its name. */
  async projectId(name: string): Promise<string> {
    const answer = await this.page.request.get(`${this.url}/api/projects`);
    const { items } = (await answer.json()) as { items: { id: string; name: string }[] };
    const found = items.find((project) => project.name === name);
    if (!found) throw new Error(`There is no project “${name}”.`);
    return found.id;
  }

  async firstProjectId(): Promise<string> {
    const answer = await this.page.request.get(`${this.url}/api/projects`);
    const { items } = (await answer.json()) as { items: { id: string }[] };
    return items[0].id;
  }
}
