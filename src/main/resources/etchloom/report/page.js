"use strict";
// A table wider than the page scrolls; so that keys can scroll it too, it takes the focus then.
(function () {
  const watch = new ResizeObserver((entries) => entries.forEach((e) => {
    const box = e.target;
    if (box.scrollWidth > box.clientWidth + 1) {
      const caption = box.querySelector("caption");
      box.tabIndex = 0;
      box.setAttribute("role", "region");
      box.setAttribute("aria-label", caption ? caption.textContent : "Table");
    } else {
      ["tabindex", "role", "aria-label"].forEach((a) => box.removeAttribute(a));
    }
  }));
  document.querySelectorAll(".scroll").forEach((box) => watch.observe(box));
})();
