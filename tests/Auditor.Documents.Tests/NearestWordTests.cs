namespace Auditor.Documents.Tests;

public class NearestWordTests
{
    [Theory]
    [InlineData("lenght", "length")]
    [InlineData("legnth", "length")]
    [InlineData("lngth", "length")]
    [InlineData("lengthh", "length")]
    [InlineData("LENGTH", "length")]
    [InlineData("mehtod", "method")]
    [InlineData("trunkin", "trunking")]
    [InlineData("b", null)]
    [InlineData("xyz", null)]
    [InlineData("something else", null)]
    [InlineData("", null)]
    public void A_slip_is_seen_through(string word, string? expected)
        => Assert.Equal(expected, NearestWord.Find(word, ["length", "method", "trunking", "csa"]));

    [Fact]
    public void Of_words_equally_near_the_first_is_taken() => Assert.Equal("cart", NearestWord.Find("cat", ["cart", "cast"]));

    [Fact]
    public void A_word_of_two_letters_is_right_but_for_its_case_or_not_meant()
    {
        Assert.Equal("kA", NearestWord.Find("KA", ["kA", "mA"]));
        Assert.Null(NearestWord.Find("nA", ["kA", "mA"]));
    }

    [Fact]
    public void A_word_as_long_as_a_file_takes_no_time()
    {
        var endless = new string('x', 50_000_000);

        Assert.Null(NearestWord.Find(endless, ["length", endless + "y"]));
        Assert.Null(NearestWord.Find("length", [endless]));
    }
}
