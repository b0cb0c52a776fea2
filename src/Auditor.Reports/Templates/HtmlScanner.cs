namespace Auditor.Reports.Templates;

/// <summary>
/// Follows HTML character by character, as far as is needed to tell whether a text put in next stays text: the tokenizer of the HTML
/// standard, its states reduced to those that differ in this.
/// </summary>
internal sealed class HtmlScanner
{
    /// <summary>
    /// Elements whose content is not text. <c>noscript</c> is not among them: where scripts run, only <c>&lt;/noscript</c> ends it, and an inserted
    /// text holds no <c>&lt;</c>, so that what a script puts in from there is what a browser without scripts reads.
    /// </summary>
    private static readonly HashSet<string> RawElements =
        new(["script", "style", "xmp", "iframe", "noembed", "noframes", "plaintext"], StringComparer.OrdinalIgnoreCase);

    private static readonly HashSet<string> LinkAttributes = new(
        ["href", "xlink:href", "src", "srcset", "action", "formaction", "data", "poster", "cite", "background", "ping", "manifest", "longdesc", "usemap"],
        StringComparer.OrdinalIgnoreCase);

    /// <summary>Longer than every name that matters: what follows in a longer one tells nothing.</summary>
    private const int LongestName = 32;

    private string _element = "";
    private string _attribute = "";
    private string _word = "";
    private bool _isEndTag;
    private bool _hasNameEnded;
    private bool _isOwnPage;

    /// <summary>Where the next character stands.</summary>
    public HtmlPlace Place { get; private set; }

    /// <summary>Name of the element whose content is not text, such as <c>script</c>; empty elsewhere.</summary>
    public string RawElement => Place == HtmlPlace.RawText ? _element : "";

    /// <summary>Whether a text may be put in here.</summary>
    public bool TakesText => Place == HtmlPlace.Text || (Place is HtmlPlace.DoubleQuoted or HtmlPlace.SingleQuoted && TakesValue());

    /// <summary>Follows what is written.</summary>
    public void Follow(ReadOnlySpan<char> text)
    {
        for (var i = 0; i < text.Length; i++)
        {
            if (Place == HtmlPlace.Text)
            {
                var next = text[i..].IndexOf('<');
                if (next < 0)
                {
                    return;
                }

                i += next;
            }

            Step(text[i]);
        }
    }

    private void Step(char c)
    {
        Place = Place switch
        {
            HtmlPlace.Text => Open(),
            HtmlPlace.TagStart => TagStart(c),
            HtmlPlace.TagName => TagName(c),
            HtmlPlace.Tag => InTag(c),
            HtmlPlace.AttributeName => AttributeName(c),
            HtmlPlace.BeforeValue => BeforeValue(c),
            HtmlPlace.DoubleQuoted => Quoted(c, '"'),
            HtmlPlace.SingleQuoted => Quoted(c, '\''),
            HtmlPlace.Unquoted => IsSpace(c) ? HtmlPlace.Tag : c == '>' ? EndTag() : HtmlPlace.Unquoted,
            HtmlPlace.Declaration => Declaration(c),
            HtmlPlace.Comment => Until(c, "-->", HtmlPlace.Comment),
            _ => Raw(c),
        };
    }

    private HtmlPlace Open()
    {
        _word = "";
        return HtmlPlace.TagStart;
    }

    private HtmlPlace TagStart(char c)
    {
        _isEndTag = c == '/';
        _element = char.IsAsciiLetter(c) ? c.ToString() : "";
        return c switch
        {
            '/' => HtmlPlace.TagName,
            '!' or '?' => HtmlPlace.Declaration,
            '<' => HtmlPlace.TagStart,
            _ => char.IsAsciiLetter(c) ? HtmlPlace.TagName : HtmlPlace.Text,
        };
    }

    private HtmlPlace TagName(char c)
    {
        if (IsSpace(c) || c == '/')
        {
            return HtmlPlace.Tag;
        }

        if (c == '>')
        {
            return EndTag();
        }

        _element = Grown(_element, c);
        return HtmlPlace.TagName;
    }

    private HtmlPlace InTag(char c)
    {
        if (c == '>')
        {
            return EndTag();
        }

        _attribute = c.ToString();
        _hasNameEnded = false;
        return IsSpace(c) || c == '/' ? HtmlPlace.Tag : HtmlPlace.AttributeName;
    }

    private HtmlPlace AttributeName(char c)
    {
        if (c == '=')
        {
            return HtmlPlace.BeforeValue;
        }

        if (c is '>' or '/')
        {
            return InTag(c);
        }

        // A name that a space has ended waits for its `=`; where none comes it has no value, and another name begins.
        if (!IsSpace(c))
        {
            _attribute = _hasNameEnded ? c.ToString() : Grown(_attribute, c);
        }

        _hasNameEnded = IsSpace(c);
        return HtmlPlace.AttributeName;
    }

    private HtmlPlace BeforeValue(char c)
    {
        _word = "";
        _isOwnPage = false;
        return c switch
        {
            '"' => HtmlPlace.DoubleQuoted,
            '\'' => HtmlPlace.SingleQuoted,
            '>' => EndTag(),
            _ => IsSpace(c) ? HtmlPlace.BeforeValue : HtmlPlace.Unquoted,
        };
    }

    private HtmlPlace Quoted(char c, char quote)
    {
        if (c == quote)
        {
            return HtmlPlace.Tag;
        }

        _isOwnPage |= c == '#' && _word.Length == 0;
        _word = "x";
        return Place;
    }

    private HtmlPlace EndTag()
    {
        _word = "";
        return !_isEndTag && RawElements.Contains(_element) ? HtmlPlace.RawText : HtmlPlace.Text;
    }

    private HtmlPlace Declaration(char c)
    {
        _word = Grown(_word, c);
        if (_word == "--")
        {
            _word = "";
            return HtmlPlace.Comment;
        }

        return c == '>' ? HtmlPlace.Text : HtmlPlace.Declaration;
    }

    private HtmlPlace Raw(char c) => Until(c, "</" + _element, HtmlPlace.RawText) == HtmlPlace.RawText ? HtmlPlace.RawText : CloseRaw();

    private HtmlPlace CloseRaw()
    {
        _isEndTag = true;
        return HtmlPlace.TagName;
    }

    private HtmlPlace Until(char c, string end, HtmlPlace here)
    {
        _word += c;
        if (_word.Length > end.Length)
        {
            _word = _word[^end.Length..];
        }

        return _word.Equals(end, StringComparison.OrdinalIgnoreCase) ? HtmlPlace.Text : here;
    }

    /// <summary>Whether HTML takes a character for a space.</summary>
    private static bool IsSpace(char c) => c is ' ' or '\t' or '\n' or '\r' or '\f';

    private static string Grown(string name, char c) => name.Length < LongestName ? name + c : name;

    /// <summary>
    /// Whether the value of this attribute may hold a text: none that a browser runs or takes for style, none that sets a policy, and
    /// an address only where the template has begun it with <c>#</c>, a place on the same page.
    /// </summary>
    private bool TakesValue() =>
        !_attribute.StartsWith("on", StringComparison.OrdinalIgnoreCase)
        && !(_attribute.ToUpperInvariant() is "STYLE" or "SRCDOC" or "CONTENT" or "HTTP-EQUIV")
        && (!LinkAttributes.Contains(_attribute) || _isOwnPage);
}
