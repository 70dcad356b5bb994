package rankfall.house;

import com.tngtech.archunit.core.domain.Dependency;
import com.tngtech.archunit.core.domain.JavaClass;
import com.tngtech.archunit.lang.ArchCondition;
import com.tngtech.archunit.lang.ConditionEvents;
import com.tngtech.archunit.lang.SimpleConditionEvent;
import java.util.List;
import java.util.stream.IntStream;

/** A class uses only its own room and rooms before it; classes outside all rooms are free. */
final class RoomOrder extends ArchCondition<JavaClass> {
  private final List<String> rooms;

  /**
   * The order of the rooms.
   *
   * @param rooms their packages, in the direction in which data goes
   */
  RoomOrder(List<String> rooms) {
    super("use only rooms before their own");
    this.rooms = List.copyOf(rooms);
  }

  @Override
  public void check(JavaClass user, ConditionEvents events) {
    int own = number(user);
    for (Dependency dependency : user.getDirectDependenciesFromSelf()) {
      if (own >= 0 && number(dependency.getTargetClass()) > own) {
        events.add(SimpleConditionEvent.violated(user, dependency.getDescription()));
      }
    }
  }

  /** The number of the room from 0, or -1 outside all rooms. */
  private int number(JavaClass c) {
    return IntStream.range(0, rooms.size())
        .filter(i -> (c.getPackageName() + ".").startsWith(rooms.get(i) + "."))
        .findFirst()
        .orElse(-1);
  }
}
