// @vitest-environment happy-dom
import { afterEach, beforeEach, describe, expect, it, vi } from "vitest";
import {
  letDialogsOpen,
  letPasswordsShow,
  type Sent,
  takeOverForms,
} from "#src/components/forms/send-form.ts";

/** The markup of SendForm.astro, TextField and SubmitButton as the server renders it. */
const FORM = `
  <form action="/api/sign-in" data-send="POST" data-then="say">
    <div data-fault hidden role="alert" tabindex="-1">
      <p><svg></svg><span data-title></span></p><p data-detail></p><ul></ul>
    </div>
    <label for="email">Email</label><span class="relative"><input id="email" name="email" value="ines" aria-describedby="hint"></span>
    <p id="hint">An address.</p>
    <span class="relative"><input id="password" name="password" type="password" value="secret"></span>
    <button type="button" data-shows="password">Show</button>
    <button type="submit"><span><span>Sign in</span><span class="invisible">Signing in</span></span></button>
    <p data-done hidden tabindex="-1">Done.</p>
  </form>`;

const problem = (body: object, status = 422) =>
  new Response(
    JSON.stringify({ title: "Some of this cannot be taken as it is.", detail: "Each field says.", ...body }),
    {
      status,
    },
  );

let replies: (Response | Error)[] = [];
const asked = vi.fn(async (_path: string, _init: RequestInit) => {
  const reply = replies.shift();
  if (!reply || reply instanceof Error) throw reply ?? new Error("no reply was set");
  return reply;
});

// Listeners on the document stay; they are added once, as on a page.
takeOverForms(document);
letPasswordsShow(document);
letDialogsOpen(document);

beforeEach(() => {
  vi.stubGlobal("fetch", asked);
  document.body.innerHTML = FORM;
});
afterEach(() => {
  vi.unstubAllGlobals();
  asked.mockClear();
  replies = [];
});

const form = () => document.querySelector("form") as HTMLFormElement;
const fault = () => document.querySelector("[data-fault]") as HTMLElement;
const field = (id: string) => document.getElementById(id) as HTMLInputElement;

async function send(...answers: (Response | Error)[]): Promise<void> {
  replies = answers;
  form().requestSubmit();
  await vi.waitFor(() => expect(form().hasAttribute("data-busy")).toBe(false));
}

describe("a form that goes out as JSON", () => {
  it("is sent once, busy meanwhile, with its method, path and content", async () => {
    let answer: (reply: Response) => void = () => undefined;
    asked.mockImplementationOnce(() => new Promise((resolve) => (answer = resolve)));
    form().requestSubmit();
    form().requestSubmit();
    const button = document.querySelector('button[type="submit"]');
    expect(button?.getAttribute("aria-disabled")).toBe("true");
    expect(asked).toHaveBeenCalledOnce();
    const [path, init] = asked.mock.calls[0] ?? [];
    expect([path, init?.method, init?.body]).toEqual([
      "/api/sign-in",
      "POST",
      JSON.stringify({ email: "ines", password: "secret" }),
    ]);
    answer(new Response(JSON.stringify({ next: "done" })));
    await vi.waitFor(() => expect(button?.hasAttribute("aria-disabled")).toBe(false));
    expect(field("password").value).toBe("");
    expect(document.querySelector("[data-done]")?.hasAttribute("hidden")).toBe(false);
  });

  it("shows what is wrong above it and below the field, keeps the entry, and moves focus there", async () => {
    await send(problem({ errors: [{ at: "email", message: "Write an address." }] }));
    expect(fault().hidden).toBe(false);
    expect(document.activeElement).toBe(fault());
    expect(fault().querySelector("a")?.getAttribute("href")).toBe("#email");
    expect(document.getElementById("email-wrong")?.textContent).toBe("Write an address.");
    expect(field("email").getAttribute("aria-invalid")).toBe("true");
    expect(field("email").getAttribute("aria-describedby")).toBe("email-wrong hint");
    expect(field("email").value).toBe("ines");
    expect(field("password").hasAttribute("aria-invalid")).toBe(false);
    fault().querySelector("a")?.click();
    expect(document.activeElement).toBe(field("email"));
  });

  it("takes the marks away when it is sent again", async () => {
    await send(problem({ errors: [{ at: "email", message: "Write an address." }] }));
    await send(new Response(JSON.stringify({ next: "done" })));
    expect(document.getElementById("email-wrong")).toBeNull();
    expect(field("email").hasAttribute("aria-invalid")).toBe(false);
    expect(field("email").getAttribute("aria-describedby")).toBe("hint");
    expect(fault().hidden).toBe(true);
  });

  it("says what to do where no field is to blame, and when there is no connection", async () => {
    await send(problem({ title: "Too many attempts.", detail: "Wait 15 minutes, then try again." }, 429));
    expect(fault().textContent).toContain("Wait 15 minutes, then try again.");
    await send(new TypeError("fetch failed"));
    expect(fault().textContent).toContain("No connection to Tinpenny.");
  });

  it("lets its page handle the reply", async () => {
    const handled = vi.fn((event: Event) => {
      event.preventDefault();
      return (event as Sent).detail;
    });
    form().addEventListener("sent", handled);
    await send(new Response(JSON.stringify({ token: "abc" })));
    expect(handled).toHaveReturnedWith({ token: "abc" });
    expect(document.querySelector("[data-done]")?.hasAttribute("hidden")).toBe(true);
  });

  it("leaves forms alone that are not its own", () => {
    document.body.innerHTML = `<form action="/api/sign-out" method="post"><button>Out</button></form>`;
    const submit = new Event("submit", { bubbles: true, cancelable: true });
    form().dispatchEvent(submit);
    expect(submit.defaultPrevented).toBe(false);
  });
});

describe("around a form", () => {
  it("a password is shown and hidden", () => {
    const button = document.querySelector<HTMLElement>("[data-shows]");
    button?.click();
    expect([field("password").type, button?.textContent]).toEqual(["text", "Hide"]);
    button?.click();
    expect([field("password").type, button?.textContent]).toEqual(["password", "Show"]);
  });

  it("a dialog is opened by the button that names it, and closed by its own", () => {
    document.body.innerHTML = `<button data-opens="ask">Remove</button>
      <dialog id="ask"><button data-closes>Leave it</button></dialog>`;
    const dialog = document.querySelector("dialog") as HTMLDialogElement;
    document.querySelector<HTMLElement>("[data-opens]")?.click();
    expect(dialog.open).toBe(true);
    document.querySelector<HTMLElement>("[data-closes]")?.click();
    expect(dialog.open).toBe(false);
  });
});
