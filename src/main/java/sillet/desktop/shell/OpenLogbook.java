package sillet.desktop.shell;

import sillet.logbook.shop.Shop;
import sillet.store.Logbook;
import sillet.store.place.LogbookPlace;

/** A logbook that is open, the shop it belongs to, and where it lies. */
record OpenLogbook(Logbook logbook, Shop shop, LogbookPlace place) {}
