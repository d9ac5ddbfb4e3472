// What jsdom leaves out and pages use: no media query matches, nothing scrolls, a dialog only opens and closes.
window.matchMedia ??= (media) =>
  Object.assign(new EventTarget(), {
    matches: false,
    media,
    onchange: null,
    addListener: () => undefined,
    removeListener: () => undefined,
  });

Element.prototype.scrollIntoView ??= () => undefined;

HTMLDialogElement.prototype.showModal ??= function (this: HTMLDialogElement) {
  this.open = true;
};

HTMLDialogElement.prototype.close ??= function (this: HTMLDialogElement) {
  this.open = false;
};
