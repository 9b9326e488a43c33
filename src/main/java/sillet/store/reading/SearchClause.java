package sillet.store.reading;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.regex.Pattern;
import sillet.store.columns.SearchText;

/**
 * What was typed into a search field as a condition: every word has to be found in one of the keys,
 * or be the number of a ticket; a telephone number is found however it is divided.
 *
 * @param sql condition with named places
 * @param values for the places
 */
record SearchClause(String sql, Map<String, Object> values) {
  private static final Pattern TICKET = Pattern.compile("#?(\\d{1,9})");

  /**
   * A condition.
   *
   * @param typed what was typed
   * @param keys columns with search keys
   * @param ticketCondition condition with one %s for the place of a ticket's number; empty where no
   *     ticket can be looked for
   * @return the condition, true for a blank text
   */
  static SearchClause of(String typed, List<String> keys, String ticketCondition) {
    List<String> all = new ArrayList<>();
    Map<String, Object> values = new LinkedHashMap<>();
    List<String> words = SearchText.words(typed);
    for (int i = 0; i < words.size(); i++) {
      String place = "word" + i;
      values.put(place, SearchText.anywhere(words.get(i)));
      List<String> any = new ArrayList<>();
      keys.forEach(key -> any.add(key + " LIKE :" + place + " ESCAPE '!'"));
      var ticket = TICKET.matcher(words.get(i));
      if (!ticketCondition.isEmpty() && ticket.matches()) {
        values.put("ticket" + i, Integer.valueOf(ticket.group(1)));
        any.add(ticketCondition.replace("%s", ":ticket" + i));
      }
      all.add("(" + String.join(" OR ", any) + ")");
    }
    if (all.isEmpty()) {
      return new SearchClause("1 = 1", values);
    }
    String sql = "(" + String.join(" AND ", all) + ")";
    return SearchText.phone(typed)
        ? orPhone(sql, values, typed, keys)
        : new SearchClause(sql, values);
  }

  private static SearchClause orPhone(
      String sql, Map<String, Object> values, String typed, List<String> keys) {
    values.put("digits", SearchText.anywhere(SearchText.digits(typed)));
    List<String> any = new ArrayList<>();
    keys.forEach(key -> any.add(key + " LIKE :digits ESCAPE '!'"));
    return new SearchClause("(" + sql + " OR " + String.join(" OR ", any) + ")", values);
  }
}
