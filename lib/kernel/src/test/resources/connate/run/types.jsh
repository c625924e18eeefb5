/// # odd
record R<T>(T value) { static int made = 0; }
var r = new R<>(List.of("a"));
r.value().get(0)
enum Facies { SAND, SHALE { @Override String tag() { return "sh"; } }; String tag() { return "sd"; } }
Facies.SHALE.tag()
sealed interface Shape permits Circle, Square {}
record Circle(double r) implements Shape {}
record Square(double a) implements Shape {}
double area(Shape s) { return s instanceof Circle c ? Math.PI * c.r() * c.r() : s instanceof Square q ? q.a() * q.a() : 0; }
area(new Square(3))
int fact(int n) { return n < 2 ? 1 : n * fact(n - 1); }
fact(10)
boolean even(int n) { return n == 0 || odd(n - 1); }
boolean odd(int n) { return n != 0 && even(n - 1); }
even(10)
var text = """
    /// not prose
    "quoted" } { ;
    """;
text
var kind = switch (3) { case 1, 2 -> "low"; default -> { String q = "hi"; yield q + "gh"; } };
kind
switch (kind) { case "high" -> System.out.println("it is high"); default -> System.out.println("other"); }
var größe = 3.5; // unicode µ
größe * 2
var m = 7;
m + 1
m(3)
var mD = 5
mD
int[] arr = {3, 1, 2};
Arrays.sort(arr);
arr
int[][] grid = {{1, 2}, {3}}
grid
outer: for (int i = 0; i < 3; i++) { for (int j = 0; j < 3; j++) { if (j == 1) continue outer; if (i == 2) break outer; System.out.println(i + "," + j); } }
