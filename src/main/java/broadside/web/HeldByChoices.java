package broadside.web;

import broadside.job.Field;
import broadside.table.Rows;
import broadside.web.FormView.Choice;
import java.util.ArrayList;
import java.util.List;

/**
 * The answers to "What is it fixed to?": those of the kind of item, and those outside the scope of this tool, each said to be so.
 *
 * @param scope  the answers outside the scope, and whether loads are shown for them
 * @param item   path of the item on the page
 */
record HeldByChoices(Rows scope, Answers answers, String item) {

    List<Choice> of(Field field, String path) {
        Kind kind = Kind.of(answers.get(item + ".kind")).orElse(Kind.POST_SIGN);
        String now = answers.get(path);
        List<String> offered = new ArrayList<>(kind.heldBy());
        field.choices().stream().filter(w -> scope.has(w) && !offered.contains(w)).forEach(offered::add);
        if (!now.isBlank() && !offered.contains(now)) {
            offered.add(now);
        }
        return offered.stream().map(w -> new Choice(path + "-" + w.replace(' ', '-'), w, ChoiceWords.of("held-by", w).words(), small(kind, w), now.equals(w))).toList();
    }

    private String small(Kind kind, String word) {
        if (!scope.has(word) || kind.heldBy().contains(word)) {
            return "";
        }
        String shown = scope.text(word, "shown").equals("nothing") ? "no loads are given" : "loads only";
        boolean known = kind == Kind.POST_SIGN && word.equals("existing post");
        return "outside the scope of this tool" + (known ? " unless its section is given below: " : ": ") + shown;
    }
}
