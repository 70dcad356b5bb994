package rankfall.published;

/** The program as it stands against the published tables. */
class PublishedValuesTest extends PublishedValuesContract {
  @Override
  FamilyObserver program() {
    return new RoomsObserver();
  }
}
