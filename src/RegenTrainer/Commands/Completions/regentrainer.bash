# Completions of regentrainer for bash: the program itself says what can follow, file names are added by the shell.
_regentrainer() {
    local line=${COMP_LINE:0:COMP_POINT} word=${COMP_WORDS[COMP_CWORD]} IFS=$'\n'
    line=${line#*[[:space:]]}
    COMPREPLY=($(compgen -W "$("${COMP_WORDS[0]}" "[suggest:${#line}]" "$line" 2>/dev/null | grep -v '^/\|^-?$')" -- "$word"))
}
complete -o default -F _regentrainer regentrainer
