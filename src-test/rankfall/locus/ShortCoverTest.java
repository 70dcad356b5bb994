package rankfall.locus;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.BitSet;
import java.util.Collections;
import java.util.List;
import java.util.Random;
import org.junit.jupiter.api.RepeatedTest;
import org.junit.jupiter.api.RepetitionInfo;
import org.junit.jupiter.api.Test;

/** Covers are checked against the truth table: each vector of the set lies in exactly one row. */
class ShortCoverTest {

  private static List<List<Integer>> cube(int places, int[] signs) {
    List<List<Integer>> all = List.of(List.of());
    for (int p = 0; p < places; p++) {
      List<List<Integer>> longer = new ArrayList<>();
      for (List<Integer> v : all) {
        for (int s : signs) {
          List<Integer> w = new ArrayList<>(v);
          w.add(s);
          longer.add(w);
        }
      }
      all = longer;
    }
    return all;
  }

  private static boolean holds(List<ShortCover.Atom> atoms, List<Integer> vector) {
    return atoms.stream()
        .allMatch(a -> a.places().stream().map(vector::get).reduce(1, (x, y) -> x * y) == a.sign());
  }

  private static BitSet where(List<ShortCover.Atom> atoms, List<List<Integer>> vectors) {
    BitSet out = new BitSet();
    for (int k = 0; k < vectors.size(); k++) {
      if (holds(atoms, vectors.get(k))) {
        out.set(k);
      }
    }
    return out;
  }

  @RepeatedTest(60)
  void rowsAreDisjointMinimalAndCoverTheSet(RepetitionInfo info) {
    int seed = info.getCurrentRepetition();
    Random random = new Random(seed);
    int places = 1 + random.nextInt(4);
    List<List<Integer>> vectors = new ArrayList<>(cube(places, new int[] {1, -1}));
    Collections.shuffle(vectors, random);
    vectors = vectors.subList(0, 1 + random.nextInt(vectors.size()));
    BitSet target = new BitSet();
    for (int k = 0; k < vectors.size(); k++) {
      target.set(k, random.nextBoolean());
    }
    BitSet covered = new BitSet();
    for (ShortCover.Row r : new ShortCover(vectors, Collections.nCopies(places, 1)).of(target)) {
      BitSet own = where(r.atoms(), vectors);
      assertEquals(own, r.holds(), "seed " + seed);
      assertFalse(own.intersects(covered), "seed " + seed + ": rows overlap");
      covered.or(own);
      for (ShortCover.Atom a : r.atoms()) {
        List<ShortCover.Atom> fewer = new ArrayList<>(r.atoms());
        fewer.remove(a);
        assertFalse(where(fewer, vectors).equals(own), "seed " + seed + ": " + a + " follows");
      }
    }
    assertEquals(target, covered, "seed " + seed);
  }

  /** Two opposite octants are one row of two products; all of the space needs no condition. */
  @Test
  void productsMergeOppositeOctants() {
    List<List<Integer>> vectors = cube(3, new int[] {1, -1});
    BitSet same = new BitSet();
    same.set(vectors.indexOf(List.of(1, 1, 1)));
    same.set(vectors.indexOf(List.of(-1, -1, -1)));
    ShortCover cover = new ShortCover(vectors, List.of(1, 1, 1));
    assertEquals(1, cover.of(same).size());
    assertEquals(2, cover.of(same).get(0).atoms().size());
    BitSet all = new BitSet();
    all.set(0, vectors.size());
    assertEquals(List.of(), cover.of(all).get(0).atoms());
  }

  /** Where a polynomial vanishes no strict condition on it holds: such a vector may stay alone. */
  @Test
  void vectorsWithoutSignsAreNotClaimed() {
    List<List<Integer>> vectors = List.of(List.of(1), List.of(0), List.of(-1));
    BitSet zero = new BitSet();
    zero.set(1);
    assertTrue(new ShortCover(vectors, List.of(1)).of(zero).isEmpty());
  }

  /** A list that may lack vectors: each row tells all its signs. */
  @Test
  void singlesTellAllSigns() {
    List<List<Integer>> vectors = List.of(List.of(1, 1), List.of(-1, 1));
    BitSet all = new BitSet();
    all.set(0, 2);
    List<ShortCover.Row> rows = new ShortCover(vectors, List.of(1, 1)).singles(all);
    assertEquals(2, rows.size());
    assertTrue(rows.stream().allMatch(r -> r.atoms().size() == 2));
  }
}
