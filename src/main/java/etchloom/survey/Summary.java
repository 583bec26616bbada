package etchloom.survey;

import java.util.ArrayList;
import java.util.Collections;
import java.util.Comparator;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.PriorityQueue;
import java.util.Set;

/** What a first look through all rows tells; its size does not depend on their number. */
final class Summary {
  /** Rows that a terminal shows. */
  static final int SHOWN = 20;

  /** Rows that a page shows; beyond, browsers become slow. */
  static final int ON_PAGE = 5000;

  private final Listing listing;
  private final Comparator<Row> order;
  private final Set<String> columns = new LinkedHashSet<>();
  private final PriorityQueue<Row> top;
  private final PriorityQueue<Place> page;
  private long count;
  private long kept;
  private long passed;
  private long undrawn;
  private long faults;

  /** A row's place in the order, without its figures. */
  private record Place(Row row) {}

  Summary(Listing listing) {
    this.listing = listing;
    order = listing.rank().map(Ranking::order).orElse(Comparator.comparingLong(Row::variant));
    top = new PriorityQueue<>(order.reversed());
    page = new PriorityQueue<>(Comparator.comparing(Place::row, order).reversed());
  }

  void add(Row row) {
    count++;
    if (!row.drawn()) {
      undrawn++;
    }
    if (row.reason().startsWith(Bench.FAULT)) {
      faults++;
    }
    if (!listing.keeps(row)) {
      return;
    }
    kept++;
    if (row.passed()) {
      passed++;
    }
    columns.addAll(row.figures().keySet());
    top.add(row);
    if (top.size() > SHOWN) {
      top.remove();
    }
    page.add(new Place(light(row)));
    if (page.size() > ON_PAGE) {
      page.remove();
    }
  }

  /** Only what decides the order. */
  private Row light(Row row) {
    java.util.Map<String, Object> figures = new java.util.LinkedHashMap<>();
    listing.rank().ifPresent(r -> r.of(row).ifPresent(v -> figures.put(r.name().name(), v)));
    return new Row(row.variant(), java.util.Map.of(), row.passed(), "", figures);
  }

  Listing listing() {
    return listing;
  }

  /** All rows. */
  long count() {
    return count;
  }

  /** Rows that fulfil the condition. */
  long kept() {
    return kept;
  }

  /** Of these, rows that keep every rule. */
  long passed() {
    return passed;
  }

  /** Of all rows, those that could not be drawn. */
  long undrawn() {
    return undrawn;
  }

  /** Of all rows, those in which the program itself failed. */
  long faults() {
    return faults;
  }

  /** Every figure of the kept rows, in the report's order as far as rows agree. */
  List<String> columns() {
    return List.copyOf(columns);
  }

  /** The first rows in the order asked for. */
  List<Row> top() {
    List<Row> out = new ArrayList<>(top);
    out.sort(order);
    return Collections.unmodifiableList(out);
  }

  /** Numbers of the rows for the page, in the order asked for. */
  List<Long> onPage() {
    List<Row> out = new ArrayList<>();
    page.forEach(p -> out.add(p.row()));
    out.sort(order);
    return out.stream().map(Row::variant).toList();
  }
}
