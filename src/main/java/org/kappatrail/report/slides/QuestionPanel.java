package org.kappatrail.report.slides;

import java.awt.geom.Rectangle2D;
import java.util.ArrayList;
import java.util.List;
import org.kappatrail.report.office.ShownText;
import org.kappatrail.review.decision.Decision;
import org.kappatrail.review.decision.Reply;

/** The five questions with their answers and figures, in the room that there is. */
final class QuestionPanel {
  private static final double HEAD = 15;
  private static final double TEXT = 14;
  private static final double GAP = 5;

  private QuestionPanel() {}

  /**
   * One of the five.
   *
   * @param words the question
   * @param reply its answer
   */
  record Question(String words, Reply reply) {}

  static List<Question> questions(Decision decision) {
    return List.of(
        new Question("Is the drop real?", decision.real()),
        new Question("Does an act pay?", decision.matters()),
        new Question("Is it the oil's doing?", decision.oilToBlame()),
        new Question("Would fresh oil cure it?", decision.curable()),
        new Question("Is it urgent?", decision.urgent()));
  }

  static void draw(Leaf leaf, Rectangle2D place, Decision decision) {
    List<Question> questions = questions(decision);
    int[] lines = share(leaf.fit(), questions, place);
    double y = place.getY();
    for (int i = 0; i < questions.size(); i++) {
      Question question = questions.get(i);
      double height = HEAD * TextFit.LINE + lines[i] * TEXT * TextFit.LINE;
      Box box = leaf.box(place.getX(), y, place.getWidth(), height + 1);
      box.line(question.words() + "  " + question.reply().answer().label(), HEAD, true);
      if (lines[i] > 0) {
        box.paragraph(question.reply().why(), TEXT, false, lines[i]);
      }
      y += height + GAP;
    }
  }

  private static String shown(Question question) {
    return Words.joined(ShownText.of(question.reply().why()));
  }

  /** Lines of figures for each question: what it needs, less where the room is short. */
  private static int[] share(TextFit fit, List<Question> questions, Rectangle2D place) {
    double heads = questions.size() * (HEAD * TextFit.LINE + GAP);
    int room = (int) Math.floor((place.getHeight() - heads) / (TEXT * TextFit.LINE));
    List<Integer> wanted = new ArrayList<>();
    for (Question question : questions) {
      wanted.add(fit.lines(shown(question), place.getWidth(), TEXT, false).size());
    }
    int[] given = new int[questions.size()];
    for (int round = 1; room > 0 && round <= 10; round++) {
      for (int i = 0; i < given.length && room > 0; i++) {
        if (given[i] < wanted.get(i)) {
          given[i]++;
          room--;
        }
      }
    }
    return given;
  }
}
