import { provideHttpClient } from '@angular/common/http';
import { HttpTestingController, provideHttpClientTesting } from '@angular/common/http/testing';
import type { Provider, Type } from '@angular/core';
import { type ComponentFixture, TestBed } from '@angular/core/testing';
import { provideRouter } from '@angular/router';
import type { Role } from '#shared/actor/role';
import { SESSION_PORT } from '../app/core/session/session-port';
import { Confirm } from '../app/ui/dialog/confirm';
import { signIn, words } from './sign-in';

interface Opening {
  readonly inputs?: Readonly<Record<string, unknown>>;
  /** Who is signed in; nobody where it is left out. */
  readonly roles?: readonly Role[];
  /** What is answered when a question is put before something is lost. */
  readonly isSure?: boolean;
  readonly providers?: readonly Provider[];
}

/** A page or widget in a test, as a person meets it: what is read, what can be pressed and entered, what was asked of the server. */
export class OpenedWidget<T> {
  private constructor(
    readonly fixture: ComponentFixture<T>,
    readonly http: HttpTestingController,
  ) {}

  static async open<T>(component: Type<T>, opening: Opening = {}): Promise<OpenedWidget<T>> {
    const { inputs = {}, roles, isSure = true, providers = [] } = opening;
    TestBed.configureTestingModule({
      providers: [
        ...[words, provideHttpClient(), provideHttpClientTesting(), provideRouter([])],
        { provide: SESSION_PORT, useValue: { read: () => Promise.resolve() } },
        { provide: Confirm, useValue: { ask: () => Promise.resolve(isSure) } },
        ...providers,
      ],
    });
    if (roles) signIn(roles);
    const fixture = TestBed.createComponent(component);
    for (const [name, value] of Object.entries(inputs)) fixture.componentRef.setInput(name, value);
    const widget = new OpenedWidget(fixture, TestBed.inject(HttpTestingController));
    await widget.settle();
    return widget;
  }

  get element(): HTMLElement {
    return this.fixture.nativeElement as HTMLElement;
  }

  /** All that is read, with single spaces. */
  get text(): string {
    return (this.element.textContent ?? '').replace(/\s+/g, ' ').trim();
  }

  async settle(): Promise<void> {
    TestBed.tick();
    await new Promise((resolve) => setTimeout(resolve));
    TestBed.tick();
  }

  async answer(url: string, body: object | null, method = 'GET'): Promise<void> {
    this.http.expectOne({ method, url }).flush(body);
    await this.settle();
  }

  async refuse(url: string, status: number, title: string): Promise<void> {
    const problem = { type: 'about:blank', title, status, instance: '', errors: [] };
    this.http.expectOne(({ url: asked }) => asked === url).flush(problem, { status, statusText: 'refused' });
    await this.settle();
  }

  button(text: string): HTMLButtonElement | undefined {
    return [...this.element.querySelectorAll('button')].find((one) => one.textContent?.trim() === text);
  }

  async press(text: string): Promise<void> {
    const button = this.button(text);
    if (!button) throw new Error(`there is no button “${text}”`);
    button.click();
    await this.settle();
  }

  entry(name: string): HTMLInputElement {
    const entry = this.element.querySelector<HTMLInputElement>(`[formcontrolname=${name}]`);
    if (!entry) throw new Error(`there is no entry “${name}”`);
    return entry;
  }

  async enter(name: string, value: string): Promise<void> {
    const entry = this.entry(name);
    entry.value = value;
    entry.dispatchEvent(new Event('input'));
    await this.settle();
  }
}
