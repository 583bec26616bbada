package etchloom.watch;

import etchloom.report.Html;
import etchloom.report.HtmlHead;

/** The page of a spec that is not drawn as it stands now. */
final class TroublePage {
  private TroublePage() {}

  /**
   * @param trouble as it stands on the terminal
   * @param link the last board's page; empty where there is none
   */
  static String of(String trouble, String link) {
    Html h = new Html();
    HtmlHead.write(h, "Not drawn");
    h.open("body").open("main").element("h1", "Not drawn");
    h.open("pre", "class=\"trouble\"", "tabindex=\"0\"");
    trouble
        .lines()
        .forEach(l -> h.text(l.replace("\t", "    ")).raw("\n")); // both of mark and line: in line
    h.close("pre").open("p");
    if (link.isEmpty()) {
      h.text("No board was drawn yet.");
    } else {
      h.text("The files on the disk are untouched: ");
      h.element("a", "the last board that was drawn", "href=\"" + link + "\"").text(".");
    }
    h.text(" This page follows the spec and its rules: save a change, and it is drawn again.");
    h.close("p").close("main").close("body").close("html");
    return h.toString();
  }

  /** What stands on top of the last board's page while the spec is not drawn. */
  static String notice() {
    return "<p role=\"status\" class=\"watch-notice\"><strong>Not the spec as it stands:</strong> the last board"
        + " that was drawn. <a href=\"/\">What is wrong now</a></p>\n";
  }
}
